package torqueloom.app.study;

import java.util.Collection;
import java.util.Locale;
import java.util.Optional;

/** Finds the known name that was probably meant. */
public final class NearestName {
  private NearestName() {}

  /**
   * The known name nearest to a misspelt one.
   *
   * @return empty when none is near: more than about a third of the letters differ
   */
  public static Optional<String> of(String name, Collection<String> known) {
    final String wanted = normalize(name);
    String best = null;
    int bestDistance = Integer.MAX_VALUE;
    for (final String candidate : known) {
      final int distance = distance(wanted, normalize(candidate));
      if (distance < bestDistance) {
        bestDistance = distance;
        best = candidate;
      }
    }
    final int allowed = Math.max(2, (wanted.length() + 2) / 3);
    return bestDistance <= allowed && bestDistance < wanted.length()
        ? Optional.ofNullable(best)
        : Optional.empty();
  }

  /** Spellings that differ only in case or in the separator count as equal. */
  private static String normalize(String name) {
    return name.toLowerCase(Locale.ROOT).replace('_', '-').replace(' ', '-');
  }

  /**
   * Edit distance with neighboring letters swapped counted as one step (optimal string alignment,
   * after F. J. Damerau, Commun. ACM 7, 171 (1964); from memory).
   */
  static int distance(String a, String b) {
    final int[][] d = new int[a.length() + 1][b.length() + 1];
    for (int i = 0; i <= a.length(); i++) {
      for (int j = 0; j <= b.length(); j++) {
        d[i][j] = i == 0 || j == 0 ? i + j : step(a, b, d, i, j);
      }
    }
    return d[a.length()][b.length()];
  }

  private static int step(String a, String b, int[][] d, int i, int j) {
    final int change = a.charAt(i - 1) == b.charAt(j - 1) ? 0 : 1;
    int best = Math.min(d[i - 1][j - 1] + change, Math.min(d[i - 1][j], d[i][j - 1]) + 1);
    if (i > 1
        && j > 1
        && a.charAt(i - 1) == b.charAt(j - 2)
        && a.charAt(i - 2) == b.charAt(j - 1)) {
      best = Math.min(best, d[i - 2][j - 2] + 1);
    }
    return best;
  }
}
