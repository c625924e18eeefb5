package connate.console;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Optional;
import org.junit.jupiter.api.Test;

class CallTest {

  @Test
  void readsNameAndText() {
    assertEquals(Optional.of(new Call("help", Optional.empty())), Call.parse("help()"));
    assertEquals(
        Optional.of(new Call("save", Optional.of("a \"b\".jsh"))),
        Call.parse(" save ( \"a \\\"b\\\".jsh\" ) ; "));
  }

  @Test
  void leavesAllElseToTheEngine() {
    for (String java :
        new String[] {
          "help", "help(x)", "help(\"a\" + \"b\")", "x.help()", "help();help()", "table(\"a\")", ""
        }) {
      assertTrue(Call.parse(java).isEmpty(), java);
    }
  }

  @Test
  void guessesWhatBareWordsMean() {
    assertEquals(Optional.of("quit()"), Call.meant("exit;"));
    assertEquals(Optional.of("help()"), Call.meant("help"));
    assertTrue(Call.meant("porosity").isEmpty());
  }
}
