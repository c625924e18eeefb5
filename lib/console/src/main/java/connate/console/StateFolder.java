package connate.console;

import java.nio.file.Path;
import java.util.Map;

/** Where the console keeps what must outlive it: journals, history, figures. */
final class StateFolder {

  private StateFolder() {}

  /** Returns the folder by the rules of the desktop: XDG_STATE_HOME where it is absolute. */
  static Path of(Map<String, String> environment, String home) {
    String stated = environment.getOrDefault("XDG_STATE_HOME", "");
    Path base =
        !stated.isEmpty() && Path.of(stated).isAbsolute()
            ? Path.of(stated)
            : Path.of(home, ".local", "state");
    return base.resolve("connate");
  }
}
