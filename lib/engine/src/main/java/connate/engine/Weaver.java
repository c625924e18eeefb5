package connate.engine;

import java.io.IOException;
import java.io.InputStream;
import java.util.HashSet;
import java.util.Set;
import org.objectweb.asm.ClassReader;
import org.objectweb.asm.ClassVisitor;
import org.objectweb.asm.ClassWriter;
import org.objectweb.asm.Label;
import org.objectweb.asm.MethodVisitor;
import org.objectweb.asm.Opcodes;

/** Puts the calls to {@link Checkpoint} into the user's classes. */
final class Weaver {

  private static final String CHECKPOINT = "connate/engine/Checkpoint";

  private Weaver() {}

  static byte[] weave(byte[] bytes) {
    ClassReader reader = new ClassReader(bytes);
    ClassWriter writer = new ClassWriter(reader, ClassWriter.COMPUTE_MAXS);
    reader.accept(new Classes(writer), 0);
    return writer.toByteArray();
  }

  /** Weaves a class of this library once, so that the user's first need not wait. */
  static void warm() {
    try (InputStream in = Weaver.class.getResourceAsStream("Checkpoint.class")) {
      weave(in.readAllBytes());
    } catch (IOException e) {
      // without it the first command is a little slower, no more
      return;
    }
  }

  private static final class Classes extends ClassVisitor {
    Classes(ClassVisitor next) {
      super(Opcodes.ASM9, next);
    }

    @Override
    public MethodVisitor visitMethod(
        int access, String name, String descriptor, String signature, String[] exceptions) {
      MethodVisitor next = super.visitMethod(access, name, descriptor, signature, exceptions);
      return next == null ? null : new Methods(next, name);
    }
  }

  private static final class Methods extends MethodVisitor {
    private final Set<Label> passed = new HashSet<>();
    private final boolean plain;

    Methods(MethodVisitor next, String name) {
      super(Opcodes.ASM9, next);
      this.plain = !name.startsWith("<");
    }

    @Override
    public void visitCode() {
      super.visitCode();
      if (plain) {
        check();
      }
    }

    @Override
    public void visitLabel(Label label) {
      passed.add(label);
      super.visitLabel(label);
    }

    @Override
    public void visitJumpInsn(int opcode, Label label) {
      if (passed.contains(label)) {
        check();
      }
      super.visitJumpInsn(opcode, label);
    }

    @Override
    public void visitTableSwitchInsn(int min, int max, Label other, Label... labels) {
      checkBefore(other, labels);
      super.visitTableSwitchInsn(min, max, other, labels);
    }

    @Override
    public void visitLookupSwitchInsn(Label other, int[] keys, Label[] labels) {
      checkBefore(other, labels);
      super.visitLookupSwitchInsn(other, keys, labels);
    }

    private void checkBefore(Label other, Label... labels) {
      boolean back = passed.contains(other);
      for (Label label : labels) {
        back |= passed.contains(label);
      }
      if (back) {
        check();
      }
    }

    private void check() {
      super.visitMethodInsn(Opcodes.INVOKESTATIC, CHECKPOINT, "pass", "()V", false);
    }
  }
}
