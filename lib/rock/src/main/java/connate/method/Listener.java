package connate.method;

/** Hears which methods are used and what the library notices; must be safe for several threads. */
public interface Listener {

  /** Hears nothing. */
  Listener DEAF =
      new Listener() {
        @Override
        public void used(MethodCard card) {
          // nobody wants to know
        }

        @Override
        public void caution(Caution caution) {
          // nobody wants to know
        }
      };

  /** A published method was used. */
  void used(MethodCard card);

  /** The library noticed something. */
  void caution(Caution caution);
}
