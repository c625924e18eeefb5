package connate.checks;

import connate.method.Caution;
import connate.method.Listener;
import connate.method.Listening;
import connate.method.MethodCard;
import java.util.ArrayList;
import java.util.List;

/** What is told while a test runs. */
public final class Told implements Listener, AutoCloseable {

  private final List<Caution> cautions = new ArrayList<>();

  /** Starts to listen. */
  public Told() {
    Listening.to(this);
  }

  /** Returns the codes of the cautions. */
  public List<String> codes() {
    return cautions.stream().map(Caution::code).toList();
  }

  /** Returns whether a caution of this code says these words. */
  public boolean says(String code, String words) {
    return cautions.stream().anyMatch(c -> c.code().equals(code) && c.text().contains(words));
  }

  @Override
  public void used(MethodCard card) {}

  @Override
  public void caution(Caution caution) {
    cautions.add(caution);
  }

  @Override
  public void close() {
    Listening.to(Listener.DEAF);
  }

  @Override
  public String toString() {
    return cautions.toString();
  }
}
