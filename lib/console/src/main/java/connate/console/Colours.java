package connate.console;

import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.jline.reader.Highlighter;
import org.jline.reader.LineReader;
import org.jline.utils.AttributedString;
import org.jline.utils.AttributedStringBuilder;
import org.jline.utils.AttributedStyle;

/** Sets apart texts, comments and the words of the language while a command is typed. */
final class Colours implements Highlighter {

  private static final Pattern PARTS =
      Pattern.compile(
          "(?<note>//[^\\n]*|/\\*.*?(?:\\*/|$))|(?<text>\"(?:[^\"\\\\\\n]|\\\\.)*\"?)"
              + "|(?<word>\\b(?:var|new|for|if|else|while|do|return|record|class|enum|interface"
              + "|import|static|final|void|int|double|long|boolean|switch|case|try|catch|throw"
              + "|true|false|null|instanceof)\\b)",
          Pattern.DOTALL);

  private final boolean on;

  Colours(boolean on) {
    this.on = on;
  }

  @Override
  public AttributedString highlight(LineReader reader, String buffer) {
    if (!on) {
      return new AttributedString(buffer);
    }
    AttributedStringBuilder out = new AttributedStringBuilder();
    Matcher part = PARTS.matcher(buffer);
    int done = 0;
    while (part.find()) {
      out.append(buffer.substring(done, part.start()));
      out.append(part.group(), style(part));
      done = part.end();
    }
    return out.append(buffer.substring(done)).toAttributedString();
  }

  private static AttributedStyle style(Matcher part) {
    if (part.group("note") != null) {
      return AttributedStyle.DEFAULT.faint();
    }
    return part.group("text") != null
        ? AttributedStyle.DEFAULT.foreground(AttributedStyle.GREEN)
        : AttributedStyle.DEFAULT.bold();
  }
}
