package connate.console;

import connate.record.StoredLog;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Parameters;

/** Brings workbook and data of a packed log back, byte for byte. */
@Command(
    name = "connate unpack",
    mixinStandardHelpOptions = true,
    header = {"connate unpack north.html north/", ""},
    description = "Writes the workbook and the input files of a packed log into a folder.")
final class UnpackCommand implements Callable<Integer> {

  @Parameters(index = "0", paramLabel = "LOG", description = "a log made with --pack")
  private Path file;

  @Parameters(index = "1", paramLabel = "DIR", description = "a folder that is empty or new")
  private Path folder;

  @Override
  public Integer call() throws IOException {
    StoredLog log = StoredLog.read(file);
    if (Files.isDirectory(folder)) {
      try (var files = Files.list(folder)) {
        if (files.findAny().isPresent()) {
          System.err.println("connate: " + folder + " is not empty; name a new folder");
          return Exit.USAGE;
        }
      }
    }
    log.unpack(folder);
    System.out.println(folder.resolve(log.workbookName()));
    log.files().keySet().forEach(path -> System.out.println(folder.resolve(path)));
    if (!log.isPacked()) {
      System.err.println("connate: the log carries no input files; only the workbook was written");
    }
    return Exit.DONE;
  }
}
