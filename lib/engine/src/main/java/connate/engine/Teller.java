package connate.engine;

import connate.method.Caution;
import connate.method.Listener;
import connate.method.Listening;
import connate.method.MethodCard;
import connate.protocol.Channel;
import connate.protocol.Event;
import connate.protocol.Reply;
import java.io.IOException;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.Map;
import java.util.Set;

/** Tells the kernel what happens while a command runs. */
final class Teller implements Listener {

  private static final int MOST_CAUTIONS = 200;

  private final Channel channel;
  private final Map<Caution, Integer> cautions = new LinkedHashMap<>();
  private final Set<MethodCard> cards = new LinkedHashSet<>();
  private int command = -1;
  private boolean muted;
  private int dropped;
  private int stopped = -1;

  Teller(Channel channel) {
    this.channel = channel;
  }

  synchronized void begin(int number, boolean quiet) {
    command = number;
    muted = quiet;
    cautions.clear();
    cards.clear();
    dropped = 0;
    Listening.fresh();
  }

  /** Tells the last event of a command, and before it what the library noted. */
  synchronized void end(Event last) {
    cards.forEach(card -> tell(told(card)));
    cautions.forEach((c, n) -> tell(new Event.Cautioned(c.code(), c.about(), c.text(), n)));
    if (dropped > 0) {
      String text = dropped + " more cautions of this command are not shown";
      tell(new Event.Cautioned("many", "", text, dropped));
    }
    muted = false;
    tell(last);
    command = -1;
  }

  /** Does something if a command runs, or remembers that it is to be stopped when it begins. */
  synchronized void stop(int number, Runnable action) {
    if (command == number) {
      action.run();
    } else {
      stopped = number;
    }
  }

  /** Returns whether the running command was to be stopped before it began. */
  synchronized boolean isStopped() {
    return command == stopped;
  }

  synchronized void tell(Event event) {
    if (!muted && command >= 0) {
      send(new Reply.Told(command, event));
    }
  }

  void send(Reply reply) {
    try {
      channel.send(reply);
    } catch (IOException e) {
      // the kernel is gone, and so is the reason to live
      Runtime.getRuntime().halt(1);
    }
  }

  @Override
  public synchronized void used(MethodCard card) {
    cards.add(card);
  }

  @Override
  public synchronized void caution(Caution caution) {
    if (cautions.size() < MOST_CAUTIONS || cautions.containsKey(caution)) {
      cautions.merge(caution, 1, Integer::sum);
    } else {
      dropped++;
    }
  }

  private static Event.Used told(MethodCard card) {
    return new Event.Used(
        card.id(),
        card.title(),
        card.equation(),
        card.source(),
        card.constants().toString(),
        card.range());
  }
}
