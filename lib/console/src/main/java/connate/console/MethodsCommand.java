package connate.console;

import connate.method.MethodCard;
import connate.method.MethodCards;
import java.util.List;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Parameters;

/** Lists the catalogue of published methods. */
@Command(
    name = "connate methods",
    mixinStandardHelpOptions = true,
    header = {"connate methods", "connate methods gas slip", "connate methods timur", ""},
    description = "Lists the published methods in which all words stand; one alone in full.")
final class MethodsCommand implements Callable<Integer> {

  @Parameters(paramLabel = "WORDS", arity = "0..*", description = "words to find")
  private List<String> words = List.of();

  @Override
  public Integer call() {
    String wanted = String.join(" ", words);
    if (MethodCards.has(wanted)) {
      System.out.println(MethodCards.card(wanted));
      return Exit.DONE;
    }
    List<MethodCard> found = wanted.isBlank() ? MethodCards.all() : MethodCards.find(wanted);
    if (found.size() == 1) {
      System.out.println(found.get(0));
      return Exit.DONE;
    }
    int id = found.stream().mapToInt(c -> c.id().length()).max().orElse(0);
    for (MethodCard card : found) {
      System.out.println(
          card.id()
              + " ".repeat(id - card.id().length())
              + "  "
              + card.title()
              + ": "
              + card.equation());
    }
    if (found.isEmpty()) {
      System.err.println(
          "connate: no method has all of «"
              + wanted
              + "»"
              + Help.near(wanted, MethodCards.all().stream().map(MethodCard::id).toList()));
      return Exit.FAILED;
    }
    return Exit.DONE;
  }
}
