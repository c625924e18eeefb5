package connate.guard;

import java.io.ByteArrayInputStream;
import java.io.DataInputStream;
import java.io.IOException;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;

/** What a class file names: its constants, its family, its members. */
final class ClassFile {

  private static final int UTF8 = 1;
  private static final int INTEGER = 3;
  private static final int FLOAT = 4;
  private static final int LONG = 5;
  private static final int DOUBLE = 6;
  private static final int CLASS = 7;
  private static final int STRING = 8;
  private static final int NAME_AND_TYPE = 12;
  private static final int METHOD_HANDLE = 15;
  private static final int METHOD_TYPE = 16;
  private static final int DYNAMIC = 17;
  private static final int INVOKE_DYNAMIC = 18;
  private static final int MODULE = 19;
  private static final int PACKAGE = 20;
  private static final int NATIVE = 0x0100;

  private final DataInputStream in;
  private int[] tags;
  private int[] first;
  private int[] second;
  private String[] texts;
  private String name;
  private final List<String> parents = new ArrayList<>();
  private final Set<String> members = new HashSet<>();
  private final List<Integer> bootstraps = new ArrayList<>();
  private boolean natives;

  /** A member of a class that is referred to. */
  record Reference(String owner, String name, String descriptor) {}

  ClassFile(byte[] bytes) {
    in = new DataInputStream(new ByteArrayInputStream(bytes));
    try {
      in.skipNBytes(8);
      readConstants();
      readFamily();
      readMembers();
      readMembers();
      readAttributes(true);
    } catch (IOException e) {
      throw new IllegalArgumentException("no class file: " + e.getMessage(), e);
    }
  }

  /** Returns the class's own name, with slashes. */
  String name() {
    return name;
  }

  /** Returns the superclass and the interfaces. */
  List<String> parents() {
    return parents;
  }

  /** Returns the names of the fields and methods that it declares, with descriptors. */
  Set<String> members() {
    return members;
  }

  boolean hasNatives() {
    return natives;
  }

  boolean hasDynamicConstants() {
    for (int tag : tags) {
      if (tag == DYNAMIC) {
        return true;
      }
    }
    return false;
  }

  /** Returns all classes that are named as constants, arrays as descriptors. */
  List<String> classes() {
    List<String> found = new ArrayList<>();
    for (int i = 1; i < tags.length; i++) {
      if (tags[i] == CLASS) {
        found.add(texts[first[i]]);
      }
    }
    return found;
  }

  /** Returns all fields and methods that are referred to. */
  List<Reference> references() {
    List<Reference> found = new ArrayList<>();
    for (int i = 1; i < tags.length; i++) {
      if (tags[i] >= 9 && tags[i] <= 11) {
        found.add(reference(i));
      }
    }
    return found;
  }

  /** Returns all descriptors of members and method types. */
  List<String> descriptors() {
    List<String> found = new ArrayList<>();
    for (int i = 1; i < tags.length; i++) {
      if (tags[i] == NAME_AND_TYPE) {
        found.add(texts[second[i]]);
      } else if (tags[i] == METHOD_TYPE) {
        found.add(texts[first[i]]);
      }
    }
    members.forEach(m -> found.add(m.substring(m.indexOf(' ') + 1)));
    return found;
  }

  /** Returns the methods that link dynamic calls. */
  List<Reference> bootstraps() {
    return bootstraps.stream().map(handle -> reference(second[handle])).toList();
  }

  private Reference reference(int index) {
    int nameAndType = second[index];
    return new Reference(
        texts[first[first[index]]], texts[first[nameAndType]], texts[second[nameAndType]]);
  }

  private void readConstants() throws IOException {
    int count = in.readUnsignedShort();
    tags = new int[count];
    first = new int[count];
    second = new int[count];
    texts = new String[count];
    for (int i = 1; i < count; i++) {
      tags[i] = in.readUnsignedByte();
      readConstant(i);
      i += tags[i] == LONG || tags[i] == DOUBLE ? 1 : 0;
    }
  }

  private void readConstant(int i) throws IOException {
    switch (tags[i]) {
      case UTF8:
        texts[i] = in.readUTF();
        break;
      case INTEGER, FLOAT:
        in.readInt();
        break;
      case LONG, DOUBLE:
        in.readLong();
        break;
      case CLASS, STRING, METHOD_TYPE, MODULE, PACKAGE:
        first[i] = in.readUnsignedShort();
        break;
      case METHOD_HANDLE:
        first[i] = in.readUnsignedByte();
        second[i] = in.readUnsignedShort();
        break;
      case 9, 10, 11, NAME_AND_TYPE, DYNAMIC, INVOKE_DYNAMIC:
        first[i] = in.readUnsignedShort();
        second[i] = in.readUnsignedShort();
        break;
      default:
        throw new IOException("constant of kind " + tags[i]);
    }
  }

  private void readFamily() throws IOException {
    in.readUnsignedShort();
    name = texts[first[in.readUnsignedShort()]];
    int parent = in.readUnsignedShort();
    if (parent != 0) {
      parents.add(texts[first[parent]]);
    }
    int interfaces = in.readUnsignedShort();
    for (int i = 0; i < interfaces; i++) {
      parents.add(texts[first[in.readUnsignedShort()]]);
    }
  }

  private void readMembers() throws IOException {
    int count = in.readUnsignedShort();
    for (int i = 0; i < count; i++) {
      natives |= (in.readUnsignedShort() & NATIVE) != 0;
      members.add(texts[in.readUnsignedShort()] + " " + texts[in.readUnsignedShort()]);
      readAttributes(false);
    }
  }

  private void readAttributes(boolean ofClass) throws IOException {
    int count = in.readUnsignedShort();
    for (int i = 0; i < count; i++) {
      String kind = texts[in.readUnsignedShort()];
      int length = in.readInt();
      if (ofClass && kind.equals("BootstrapMethods")) {
        readBootstraps();
      } else {
        in.skipNBytes(length);
      }
    }
  }

  private void readBootstraps() throws IOException {
    int count = in.readUnsignedShort();
    for (int i = 0; i < count; i++) {
      bootstraps.add(in.readUnsignedShort());
      in.skipNBytes(2L * in.readUnsignedShort());
    }
  }
}
