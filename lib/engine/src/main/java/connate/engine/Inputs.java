package connate.engine;

import connate.fault.DataException;
import connate.fault.Fault;
import connate.protocol.Event;
import connate.well.Wells;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.HexFormat;
import java.util.List;

/**
 * The files that a workbook reads: found in its own folder or the data folder, read once, and told
 * with size and digest.
 */
public final class Inputs {

  private static final long LARGEST = 1L << 30;

  private final Path folder;
  private final Path data;
  private final boolean guarded;

  /**
   * Makes the inputs of a workbook.
   *
   * @param folder the workbook's folder
   * @param data the data folder, {@code null} for none
   * @param guarded whether files outside of the two are refused
   */
  Inputs(Path folder, Path data, boolean guarded) {
    this.folder = folder;
    this.data = data;
    this.guarded = guarded;
  }

  /**
   * A file that was read.
   *
   * @param name the path as the workbook's folder sees it, with forward slashes
   * @param path where the file lies
   * @param content its bytes
   */
  public record Input(String name, Path path, byte[] content) {

    /** Tells that the file is an input of the calculation. */
    void told(Teller teller, int rows, List<String> mapping) {
      teller.tell(
          new Event.InputRead(
              name, path.toString(), content.length, digest(content), rows, mapping));
    }
  }

  /**
   * Reads a file.
   *
   * @throws DataException if it is not there, is too large or cannot be read
   */
  Input read(String name) {
    Path path = resolve(name);
    try {
      if (Files.size(path) > LARGEST) {
        throw new DataException(
            Fault.ofFile(name, "F02", "larger than 1 GiB", "cut the file, or read a part of it"));
      }
      return new Input(shown(path), path, Files.readAllBytes(path));
    } catch (IOException e) {
      throw new DataException(
          Fault.ofFile(name, "F03", "cannot be read: " + e.getMessage(), "check its permissions"));
    }
  }

  /**
   * Reads the files that a pattern names, in the order of their names: those of the data folder, or
   * where there are none, those of the workbook's.
   */
  List<Input> matching(String pattern) {
    List<Path> first = data == null ? List.of() : Wells.files(data, pattern);
    List<Path> found = first.isEmpty() ? Wells.files(folder, pattern) : first;
    if (found.isEmpty()) {
      throw new DataException(
          Fault.ofFile(
              pattern,
              "W02",
              "no file fits this pattern",
              "paths are relative to the workbook's folder; * stands for any letters"));
    }
    return found.stream().map(p -> read(shown(p))).toList();
  }

  /** Returns where a file lies that the workbook names: in the data folder first, then its own. */
  Path resolve(String name) {
    Path first = data == null ? null : data.resolve(name).normalize();
    boolean isData = first != null && Files.isRegularFile(first);
    return existing(isData ? first : folder.resolve(name).normalize(), name);
  }

  /** Returns the path as its folder sees it, with forward slashes. */
  String shown(Path path) {
    Path base = data != null && path.startsWith(data) ? data : folder;
    Path relative = path.startsWith(base) ? base.relativize(path) : path.getFileName();
    return relative.toString().replace('\\', '/');
  }

  private Path existing(Path path, String name) {
    if (Files.isDirectory(path)) {
      throw new DataException(
          Fault.ofFile(name, "F01", "is a folder, where a file is expected", "name a file in it"));
    }
    if (!Files.isRegularFile(path)) {
      throw new DataException(
          Fault.ofFile(name, "F01", "no such file" + places(), Nearest.file(path)));
    }
    allow(path, name);
    return path;
  }

  /** Refuses what lies outside of the two folders, also by way of a link. */
  private void allow(Path path, String name) {
    if (guarded && !isInside(path, folder) && (data == null || !isInside(path, data))) {
      throw new Refused(
          "«"
              + name
              + "» lies outside of the workbook's folder; name its folder with --data, or "
              + "trust the workbook with --trust");
    }
  }

  private static boolean isInside(Path path, Path base) {
    try {
      return path.toRealPath().startsWith(base.toRealPath());
    } catch (IOException e) {
      return false;
    }
  }

  private String places() {
    return data == null ? " beside the workbook" : " in the data folder or beside the workbook";
  }

  private static String digest(byte[] content) {
    try {
      return HexFormat.of().formatHex(MessageDigest.getInstance("SHA-256").digest(content));
    } catch (NoSuchAlgorithmException e) {
      throw new IllegalStateException("every JDK has SHA-256", e);
    }
  }
}
