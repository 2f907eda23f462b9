package dev.holdfast.plan;

import java.util.ArrayList;
import java.util.Collection;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.Optional;

/** Finds the known word that somebody probably meant. */
public final class Nearest {
  private Nearest() {}

  /** The known word nearest to what was written, when it is near. */
  public static Optional<String> to(String written, Collection<String> known) {
    return known.stream()
        .filter(word -> isNear(written, word))
        .min(
            Comparator.<String>comparingInt(word -> distance(written, word))
                .thenComparing(Comparator.naturalOrder()));
  }

  /** Whether one word can be a slip for the other. */
  static boolean isNear(String written, String word) {
    int longest = Math.max(written.length(), word.length());
    int allowed = longest <= 3 ? 1 : longest <= 7 ? 2 : 3;
    return Math.abs(written.length() - word.length()) <= allowed
        && distance(written, word) <= allowed;
  }

  /** The known words from the nearest on, no more than asked for. */
  static List<String> first(int count, String written, Collection<String> known) {
    List<String> sorted = new ArrayList<>(known);
    // Stable: words that are equally far stay in the order in which the schema gives them.
    sorted.sort(Comparator.comparingInt(word -> distance(written, word)));
    return List.copyOf(sorted.subList(0, Math.min(count, sorted.size())));
  }

  /**
   * Optimal string alignment distance: insertions, deletions, substitutions and transpositions of
   * neighbours; case and the choice of hyphen, underscore or blank do not count.
   */
  static int distance(String one, String other) {
    String a = plain(one);
    String b = plain(other);
    int[] beforeLast = new int[b.length() + 1];
    int[] last = new int[b.length() + 1];
    int[] now = new int[b.length() + 1];
    for (int j = 0; j <= b.length(); j++) {
      last[j] = j;
    }
    for (int i = 1; i <= a.length(); i++) {
      now[0] = i;
      for (int j = 1; j <= b.length(); j++) {
        int change = a.charAt(i - 1) == b.charAt(j - 1) ? 0 : 1;
        now[j] = Math.min(Math.min(now[j - 1], last[j]) + 1, last[j - 1] + change);
        boolean swapped =
            i > 1
                && j > 1
                && a.charAt(i - 1) == b.charAt(j - 2)
                && a.charAt(i - 2) == b.charAt(j - 1);
        if (swapped) {
          now[j] = Math.min(now[j], beforeLast[j - 2] + 1);
        }
      }
      int[] spare = beforeLast;
      beforeLast = last;
      last = now;
      now = spare;
    }
    return last[b.length()];
  }

  private static String plain(String word) {
    String lower = word.toLowerCase(Locale.ROOT).replace('_', '-').replace(' ', '-');
    return lower.length() > 100 ? lower.substring(0, 100) : lower;
  }
}
