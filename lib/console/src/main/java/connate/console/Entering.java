package connate.console;

import connate.workbook.Workbook;
import java.util.List;
import org.jline.reader.CompletingParsedLine;
import org.jline.reader.EOFError;
import org.jline.reader.ParsedLine;
import org.jline.reader.Parser;

/** Ends the entry where the command ends, not the line; finds the word to complete. */
final class Entering implements Parser {

  @Override
  public ParsedLine parse(String line, int cursor, ParseContext context) {
    boolean accepts = context == ParseContext.ACCEPT_LINE || context == ParseContext.UNSPECIFIED;
    if (accepts && Workbook.isOpen(line)) {
      throw new EOFError(-1, -1, "more must follow");
    }
    return new Word(line, cursor, Typing.of(line, cursor));
  }

  private record Word(String line, int cursor, Typing typing) implements CompletingParsedLine {

    @Override
    public String word() {
      return typing.typedWord();
    }

    @Override
    public int wordCursor() {
      return word().length();
    }

    @Override
    public int wordIndex() {
      return 0;
    }

    @Override
    public List<String> words() {
      return List.of(word());
    }

    @Override
    public CharSequence escape(CharSequence candidate, boolean complete) {
      return candidate;
    }

    @Override
    public int rawWordCursor() {
      return wordCursor();
    }

    @Override
    public int rawWordLength() {
      return word().length();
    }
  }
}
