package connate.method;

import connate.fault.Nearest;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.lang.reflect.Field;
import java.net.URL;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.Collections;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;

/**
 * The catalogue of published methods: every card of the classes that the resource {@code
 * methods.txt} names. A class is loaded only when the catalogue is asked.
 */
public final class MethodCards {

  private static final String LIST = "connate/methods.txt";
  private static final Map<String, MethodCard> CARDS = read();

  private MethodCards() {}

  /** Returns all cards by title. */
  public static List<MethodCard> all() {
    return CARDS.values().stream()
        .sorted(Comparator.comparing(card -> card.title().toLowerCase(Locale.ROOT)))
        .toList();
  }

  /**
   * Returns the card of an id.
   *
   * @throws IllegalArgumentException if there is none; the message names the nearest
   */
  public static MethodCard card(String id) {
    MethodCard card = CARDS.get(id.toLowerCase(Locale.ROOT));
    if (card == null) {
      throw new IllegalArgumentException("no method " + Nearest.miss(id, CARDS.keySet()));
    }
    return card;
  }

  /** Returns whether there is a card of this id. */
  public static boolean has(String id) {
    return CARDS.containsKey(id.toLowerCase(Locale.ROOT));
  }

  /** Returns the cards in which every word stands, those that bear it in their title first. */
  public static List<MethodCard> find(String words) {
    String[] wanted = words.toLowerCase(Locale.ROOT).strip().split("\\s+");
    return all().stream()
        .filter(card -> score(card, wanted) > 0)
        .sorted(Comparator.comparingInt((MethodCard card) -> -score(card, wanted)))
        .toList();
  }

  /** 0 where a word is missing; more where words stand in a more telling place. */
  private static int score(MethodCard card, String... wanted) {
    int total = 0;
    for (String word : wanted) {
      int score = score(card, word);
      if (score == 0) {
        return 0;
      }
      total += score;
    }
    return total;
  }

  private static int score(MethodCard card, String word) {
    if (has(card.title(), word) || has(card.id(), word)) {
      return 8;
    }
    if (card.topics().stream().anyMatch(topic -> has(topic, word))) {
      return 4;
    }
    boolean named =
        has(card.resultName(), word)
            || card.inputs().stream().anyMatch(input -> has(input.name(), word));
    if (named) {
      return 2;
    }
    boolean told = has(card.source(), word) || card.notes().stream().anyMatch(n -> has(n, word));
    return told ? 1 : 0;
  }

  private static boolean has(String text, String word) {
    return text.toLowerCase(Locale.ROOT).contains(word);
  }

  private static Map<String, MethodCard> read() {
    Map<String, MethodCard> cards = new LinkedHashMap<>();
    for (String name : classes()) {
      for (MethodCard card : cardsOf(name)) {
        if (cards.put(card.id(), card) != null) {
          throw new IllegalStateException("two methods are called " + card.id());
        }
      }
    }
    return cards;
  }

  /** Returns the classes that the lists of all modules on the class path name. */
  static List<String> classes() {
    List<String> classes = new ArrayList<>();
    try {
      for (URL list : Collections.list(MethodCards.class.getClassLoader().getResources(LIST))) {
        try (InputStream in = list.openStream()) {
          new String(in.readAllBytes(), StandardCharsets.UTF_8)
              .lines()
              .map(String::strip)
              .filter(line -> !line.isEmpty())
              .forEach(classes::add);
        }
      }
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
    return classes;
  }

  private static List<MethodCard> cardsOf(String name) {
    List<MethodCard> cards = new ArrayList<>();
    try {
      for (Field field : Class.forName(name).getFields()) {
        if (field.getType() == MethodCard.class) {
          cards.add((MethodCard) field.get(null));
        }
      }
    } catch (ReflectiveOperationException e) {
      throw new IllegalStateException("methods.txt names " + name + ", which is not there", e);
    }
    return cards;
  }
}
