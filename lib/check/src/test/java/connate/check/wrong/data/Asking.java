package connate.check.wrong.data;

import connate.check.wrong.engine.Asked;

/** Breaks a rule on purpose: data asks the engine. */
public final class Asking {

  private Asking() {}

  static int ask() {
    return Asked.answer();
  }
}
