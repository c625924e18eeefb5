package connate.guard;

import org.objectweb.asm.ClassReader;
import org.objectweb.asm.ClassVisitor;
import org.objectweb.asm.Label;
import org.objectweb.asm.MethodVisitor;
import org.objectweb.asm.Opcodes;

/** Finds the line on which a class file uses what is refused. Only a refusal needs it. */
final class Sighting extends ClassVisitor {

  private final String owner;
  private final String name;
  private int found;

  private Sighting(String owner, String name) {
    super(Opcodes.ASM9);
    this.owner = owner;
    this.name = name;
  }

  static Refusal of(byte[] bytes, ClassFile.Reference reference) {
    String type = reference.owner().replace('/', '.').replace('$', '.');
    String what = reference.name().equals("<init>") ? "new " + type : type + "." + reference.name();
    return new Refusal(what, line(bytes, reference.owner(), reference.name()));
  }

  static Refusal of(byte[] bytes, String type) {
    String what = type.replace('/', '.').replace('$', '.');
    return new Refusal(what, line(bytes, type, ""));
  }

  private static int line(byte[] bytes, String owner, String name) {
    Sighting sighting = new Sighting(owner, name);
    new ClassReader(bytes).accept(sighting, ClassReader.SKIP_FRAMES);
    return sighting.found;
  }

  @Override
  public MethodVisitor visitMethod(
      int access, String method, String descriptor, String signature, String[] exceptions) {
    return new Lines();
  }

  private final class Lines extends MethodVisitor {
    private int line;

    Lines() {
      super(Opcodes.ASM9);
    }

    @Override
    public void visitLineNumber(int number, Label start) {
      line = number;
    }

    private void note(boolean seen) {
      if (seen && found == 0) {
        found = line;
      }
    }

    @Override
    public void visitMethodInsn(
        int opcode, String type, String method, String descriptor, boolean isInterface) {
      boolean same = type.equals(owner) && (name.isEmpty() || method.equals(name));
      note(same || name.isEmpty() && descriptor.contains("L" + owner + ";"));
    }

    @Override
    public void visitFieldInsn(int opcode, String type, String field, String descriptor) {
      boolean same = type.equals(owner) && (name.isEmpty() || field.equals(name));
      note(same || name.isEmpty() && descriptor.contains("L" + owner + ";"));
    }

    @Override
    public void visitTypeInsn(int opcode, String type) {
      note(name.isEmpty() && Descriptors.element(type).equals(owner));
    }

    @Override
    public void visitLdcInsn(Object value) {
      note(name.isEmpty() && value.toString().contains(owner));
    }

    @Override
    public void visitInvokeDynamicInsn(
        String method, String descriptor, org.objectweb.asm.Handle link, Object... arguments) {
      for (Object argument : arguments) {
        boolean handle =
            argument instanceof org.objectweb.asm.Handle h
                && h.getOwner().equals(owner)
                && (name.isEmpty() || h.getName().equals(name));
        note(handle || name.isEmpty() && argument.toString().contains("L" + owner + ";"));
      }
    }
  }
}
