package connate.engine;

import java.util.List;

/** Loads what the first commands will need while the kernel still compiles them. */
final class Warmth {

  private static final List<String> EARLY =
      List.of(
          "org.objectweb.asm.ClassReader",
          "org.objectweb.asm.ClassWriter",
          "connate.engine.Checkpoint",
          "connate.engine.Vocabulary",
          "connate.engine.Rendering",
          "connate.engine.Measures",
          "connate.quantity.Units",
          "connate.series.ArraySeries",
          "connate.formula.Formula");

  private Warmth() {}

  static void gather() {
    Thread thread = new Thread(Warmth::load, "warmth");
    thread.setDaemon(true);
    thread.start();
  }

  private static void load() {
    for (String name : EARLY) {
      try {
        Class.forName(name);
      } catch (ClassNotFoundException e) {
        // without it the first command is a little slower, no more
        continue;
      }
    }
    Weaver.warm();
  }
}
