package torqueloom.training.data;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.Collection;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.TreeSet;

/**
 * Class names in a fixed order. Where every label is a number, names are written plainly ("1", not
 * "1.0" or "1e0", so that files written by different programs agree) and sorted by value; otherwise
 * they stay as they are, sorted as text.
 */
final class ClassNames {
  private final List<String> names;
  private final Map<String, Integer> indexOfText = new HashMap<>();

  private ClassNames(List<String> names) {
    this.names = List.copyOf(names);
  }

  /** The distinct names of the given label texts. */
  static ClassNames of(Collection<String> texts) {
    final TreeSet<String> distinct = new TreeSet<>(texts);
    final Map<String, BigDecimal> values = new HashMap<>();
    for (final String text : distinct) {
      final BigDecimal value = numberOrNull(text);
      if (value == null) {
        return asText(distinct);
      }
      values.put(text, value);
    }
    return asNumbers(distinct, values);
  }

  private static ClassNames asText(TreeSet<String> distinct) {
    final ClassNames result = new ClassNames(List.copyOf(distinct));
    for (int i = 0; i < result.names.size(); i++) {
      result.indexOfText.put(result.names.get(i), i);
    }
    return result;
  }

  private static ClassNames asNumbers(TreeSet<String> distinct, Map<String, BigDecimal> values) {
    final List<BigDecimal> sorted = new ArrayList<>(new TreeSet<>(values.values()));
    final ClassNames result = new ClassNames(sorted.stream().map(ClassNames::plain).toList());
    for (final String text : distinct) {
      result.indexOfText.put(text, indexOf(sorted, values.get(text)));
    }
    return result;
  }

  private static int indexOf(List<BigDecimal> sorted, BigDecimal value) {
    for (int i = 0; i < sorted.size(); i++) {
      if (sorted.get(i).compareTo(value) == 0) {
        return i;
      }
    }
    throw new IllegalStateException("value " + value + " is not in its own set");
  }

  List<String> names() {
    return names;
  }

  int[] indices(List<String> texts) {
    final int[] labels = new int[texts.size()];
    for (int i = 0; i < labels.length; i++) {
      labels[i] = indexOfText.get(texts.get(i));
    }
    return labels;
  }

  private static String plain(BigDecimal value) {
    return value.signum() == 0 ? "0" : value.stripTrailingZeros().toPlainString();
  }

  private static BigDecimal numberOrNull(String text) {
    // Longer texts are identifiers; a huge exponent would write a name of a billion digits.
    if (text.length() > 24 || text.isEmpty()) {
      return null;
    }
    try {
      final BigDecimal value = new BigDecimal(text);
      return Math.abs((long) value.scale()) > 30 ? null : value;
    } catch (NumberFormatException e) {
      return null;
    }
  }
}
