package rankfall.spec;

import java.util.Collection;
import java.util.Comparator;
import java.util.Optional;

/** Finds the known name that was probably meant. */
final class Spelling {
  /** Longer words are compared by their beginning. */
  private static final int COMPARED = 64;

  private Spelling() {}

  /** The nearest of the names; of equally near ones the first in order. */
  static Optional<String> nearest(String word, Collection<String> names) {
    return names.stream()
        .min(
            Comparator.comparingInt((String name) -> distance(word, name))
                .thenComparing(Comparator.naturalOrder()));
  }

  /** The nearest of the names if it is so near that a slip of the hand explains the difference. */
  static Optional<String> meant(String word, Collection<String> names) {
    return nearest(word, names).filter(name -> isSlip(word, name));
  }

  private static boolean isSlip(String word, String name) {
    int shorter = Math.min(word.length(), name.length());
    int distance = distance(word, name);
    return word.equalsIgnoreCase(name) || distance <= (shorter + 1) / 3;
  }

  /**
   * Number of insertions, deletions, substitutions and swaps of neighbours between two words, no
   * letter touched twice (Damerau 1964, Levenshtein 1966).
   */
  static int distance(String first, String second) {
    String a = first.substring(0, Math.min(COMPARED, first.length()));
    String b = second.substring(0, Math.min(COMPARED, second.length()));
    int[][] d = new int[a.length() + 1][b.length() + 1];
    for (int i = 0; i <= a.length(); i++) {
      for (int j = 0; j <= b.length(); j++) {
        d[i][j] = i == 0 || j == 0 ? i + j : step(d, a, b, i, j);
      }
    }
    return d[a.length()][b.length()];
  }

  private static int step(int[][] d, String a, String b, int i, int j) {
    boolean same = a.charAt(i - 1) == b.charAt(j - 1);
    int best = Math.min(d[i - 1][j - 1] + (same ? 0 : 1), 1 + Math.min(d[i - 1][j], d[i][j - 1]));
    boolean swap =
        i > 1 && j > 1 && a.charAt(i - 1) == b.charAt(j - 2) && a.charAt(i - 2) == b.charAt(j - 1);
    return swap ? Math.min(best, d[i - 2][j - 2] + 1) : best;
  }
}
