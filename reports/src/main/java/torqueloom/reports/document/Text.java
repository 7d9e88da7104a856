package torqueloom.reports.document;

import java.util.ArrayList;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * Running text.
 *
 * @param spans in reading order
 */
public record Text(List<Span> spans) {
  /** No characters at all. */
  public static final Text EMPTY = new Text(List.of());

  private static final Pattern SYMBOL = Pattern.compile("\\b\\p{L}_[A-Za-z0-9]+(,[a-z]+)?");

  /** Copies the list. */
  public Text {
    spans = List.copyOf(spans);
  }

  /** Plain text. */
  public static Text of(String text) {
    return new Text(List.of(new Span(Span.Style.PLAIN, text)));
  }

  /** Text in the style for keys and digests. */
  public static Text code(String text) {
    return new Text(List.of(new Span(Span.Style.CODE, text)));
  }

  /**
   * A symbol of the literature; what follows the first underscore is set as a subscript, e.g. {@code
   * B_DL,c}.
   */
  public static Text symbol(String symbol) {
    final int cut = symbol.indexOf('_');
    final List<Span> spans = new ArrayList<>();
    spans.add(new Span(Span.Style.EMPHASIS, cut < 0 ? symbol : symbol.substring(0, cut)));
    if (cut >= 0) {
      spans.add(new Span(Span.Style.SUBSCRIPT, symbol.substring(cut + 1)));
    }
    return new Text(spans);
  }

  /**
   * A sentence in which symbols such as {@code B_z} are set with their subscripts. For the program's
   * own words, not for names that a user typed.
   */
  public static Text withSymbols(String sentence) {
    final Matcher symbols = SYMBOL.matcher(sentence);
    Text out = EMPTY;
    int from = 0;
    while (symbols.find()) {
      out = out.plus(sentence.substring(from, symbols.start())).plus(symbol(symbols.group()));
      from = symbols.end();
    }
    return out.plus(sentence.substring(from));
  }

  /** This text followed by plain text. */
  public Text plus(String text) {
    return text.isEmpty() ? this : plus(of(text));
  }

  /** This text followed by important text. */
  public Text strong(String text) {
    return plus(new Text(List.of(new Span(Span.Style.STRONG, text))));
  }

  /** This text followed by another. */
  public Text plus(Text other) {
    final List<Span> joined = new ArrayList<>(spans);
    joined.addAll(other.spans);
    return new Text(joined);
  }

  /** The characters without their styles. */
  public String plain() {
    final StringBuilder out = new StringBuilder();
    spans.forEach(span -> out.append(span.text()));
    return out.toString();
  }
}
