package connate.engine;

/**
 * Ctrl-C at a terminal reaches every process of the group, the engine too; what it means is the
 * kernel's to decide.
 */
final class Interrupts {

  private Interrupts() {}

  static void ignore() {
    try {
      Class<?> signal = Class.forName("sun.misc.Signal");
      Class<?> handler = Class.forName("sun.misc.SignalHandler");
      Object deaf = handler.getField("SIG_IGN").get(null);
      Object interrupt = signal.getConstructor(String.class).newInstance("INT");
      signal.getMethod("handle", signal, handler).invoke(null, interrupt, deaf);
    } catch (ReflectiveOperationException e) {
      // a JDK without signals: Ctrl-C then ends the engine with the kernel
      return;
    }
  }
}
