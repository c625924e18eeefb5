package connate.method;

import java.util.Objects;
import java.util.function.Supplier;

/** Where methods tell what they do; an engine listens here. */
public final class Listening {

  private static final ThreadLocal<Boolean> MUTED = ThreadLocal.withInitial(() -> false);
  private static volatile Listener listener = Listener.DEAF;
  private static volatile int epoch;

  private Listening() {}

  /** Sets the listener of this process; {@link Listener#DEAF} for none. */
  public static synchronized void to(Listener next) {
    listener = Objects.requireNonNull(next, "listener");
    fresh();
  }

  /** Forgets which cards were noted, so that each is told once more. */
  public static synchronized void fresh() {
    epoch = epoch + 1;
  }

  /** Tells that a method was used. */
  public static void used(MethodCard card) {
    if (!MUTED.get()) {
      listener.used(card);
    }
  }

  /** Tells something that the reader must know. */
  public static void caution(Caution caution) {
    if (!MUTED.get()) {
      listener.caution(caution);
    }
  }

  /** Does work of which nobody is told: trial steps of a solver, say. */
  public static <T> T quietly(Supplier<T> work) {
    boolean before = MUTED.get();
    MUTED.set(true);
    try {
      return work.get();
    } finally {
      MUTED.set(before);
    }
  }

  /** Returns a number that changes whenever cards are to be told once more. */
  public static int epoch() {
    return epoch;
  }

  /** Returns whether this thread is told to be quiet. */
  public static boolean isMuted() {
    return MUTED.get();
  }
}
