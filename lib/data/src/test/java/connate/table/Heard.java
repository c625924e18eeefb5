package connate.table;

import connate.method.Caution;
import connate.method.Listener;
import connate.method.Listening;
import connate.method.MethodCard;
import java.util.ArrayList;
import java.util.List;

/** Hears the cautions of some work. */
final class Heard implements Listener {

  private final List<Caution> cautions = new ArrayList<>();

  private Heard() {}

  /** Returns the codes of the cautions that some work raises. */
  static List<String> codes(Runnable work) {
    return during(work).stream().map(Caution::code).toList();
  }

  static List<Caution> during(Runnable work) {
    Heard heard = new Heard();
    Listening.to(heard);
    try {
      work.run();
    } finally {
      Listening.to(Listener.DEAF);
    }
    return heard.cautions;
  }

  @Override
  public void used(MethodCard card) {
    // tables use no method
  }

  @Override
  public void caution(Caution caution) {
    cautions.add(caution);
  }
}
