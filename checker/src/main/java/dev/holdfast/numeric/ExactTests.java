package dev.holdfast.numeric;

/**
 * Power of exact tests by enumeration of their outcomes.
 *
 * <p>Every function returns the chance of rejection, in [0, 1]. One-sided tests reject in the
 * direction named. A p-value equal to the level, to twelve digits, rejects.
 */
public final class ExactTests {
  /** Lets a p-value pass that is equal to the level but for rounding. */
  static final double TIE = 1 + 1e-12;

  /** Tables whose probabilities agree to so many digits count as equally probable. */
  private static final double SAME_PROBABILITY = 1 + 1e-9;

  /** Part of the largest term below which a table cannot matter. */
  private static final double NEGLIGIBLE = 1e-20;

  private ExactTests() {}

  /**
   * The exact binomial test of a share; two-sided with half the level on each side (Clopper,
   * Pearson 1934).
   *
   * @param n number of observations, from 1
   * @param nullShare share under the null hypothesis, in (0, 1)
   * @param share true share, in [0, 1]
   * @param alpha level, both sides together, in (0, 1)
   * @param twoSided whether both directions reject; otherwise only shares above, or below, the null
   * @param above direction of a one-sided test
   */
  public static double binomial(
      long n, double nullShare, double share, double alpha, boolean twoSided, boolean above) {
    double level = twoSided ? alpha / 2 : alpha;
    double power = 0;
    if (twoSided || above) {
      power += Binomial.atLeast(Binomial.upperCritical(n, nullShare, level), n, share);
    }
    if (twoSided || !above) {
      power += Binomial.atMost(Binomial.lowerCritical(n, nullShare, level), n, share);
    }
    return Math.min(1, power);
  }

  /**
   * McNemar's test in its exact conditional form: given the discordant pairs, a binomial test of a
   * half; averaged over their number (Miettinen 1968; Lachin 1992).
   *
   * @param pairs number of pairs, from 1
   * @param first share of pairs discordant in the first direction
   * @param second share of pairs discordant in the second
   * @param alpha level, both sides together, in (0, 1)
   * @param twoSided whether both directions reject; otherwise only an excess of the first
   */
  public static double mcNemar(
      long pairs, double first, double second, double alpha, boolean twoSided) {
    double discordant = first + second;
    double level = twoSided ? alpha / 2 : alpha;
    double share = first / discordant;
    long[] window = Binomial.window(pairs, discordant);
    long critical = Binomial.upperCritical(window[0], 0.5, level);
    double power = 0;
    for (long d = window[0]; d <= window[1]; d++) {
      while (Binomial.atLeast(critical, d, 0.5) > level * TIE) {
        critical++;
      }
      double given = Binomial.atLeast(critical, d, share);
      if (twoSided) {
        given += Binomial.atMost(d - critical, d, share);
      }
      power += Binomial.term(d, pairs, discordant) * given;
    }
    return Math.min(1, power);
  }

  /**
   * Fisher's exact test of two shares; two-sided by the sum over tables not more probable than the
   * observed one (Fisher 1935; Irwin 1935).
   *
   * @param n1 size of the first group, from 1
   * @param n2 size of the second group, from 1
   * @param p1 true share in the first group
   * @param p2 true share in the second group
   * @param alpha level, in (0, 1)
   * @param twoSided whether both directions reject; otherwise only a larger first share
   */
  public static double fisher(
      long n1, long n2, double p1, double p2, double alpha, boolean twoSided) {
    long[] first = Binomial.window(n1, p1);
    long[] second = Binomial.window(n2, p2);
    double[] terms1 = terms(n1, p1, first);
    double[] terms2 = terms(n2, p2, second);
    double centre = n1 * p1 + n2 * p2;
    double reach = Binomial.reach(n1 * p1 * (1 - p1) + n2 * p2 * (1 - p2));
    long least = Math.max(first[0] + second[0], (long) Math.floor(centre - reach));
    long most = Math.min(first[1] + second[1], (long) Math.ceil(centre + reach));
    double[] room = new double[(int) n1 + 1];
    double power = 0;
    for (long total = least; total <= most; total++) {
      long[] kept = kept(n1, n2, total, alpha, twoSided, room);
      long from = Math.max(first[0], total - second[1]);
      long to = Math.min(first[1], total - second[0]);
      for (long x = from; x <= Math.min(to, kept[0] - 1); x++) {
        power += terms1[(int) (x - first[0])] * terms2[(int) (total - x - second[0])];
      }
      for (long x = Math.max(from, kept[1] + 1); x <= to; x++) {
        power += terms1[(int) (x - first[0])] * terms2[(int) (total - x - second[0])];
      }
    }
    return Math.min(1, power);
  }

  /**
   * The counts of the first group, given the total, at which Fisher's test does not reject.
   *
   * @param terms room for the chance of each count
   */
  private static long[] kept(
      long n1, long n2, long total, double alpha, boolean twoSided, double[] terms) {
    long low = Math.max(0, total - n2);
    long high = Math.min(n1, total);
    double p = (double) total / (n1 + n2);
    long mode =
        Math.min(high, Math.max(low, (long) ((total + 1.0) * (n1 + 1.0) / (n1 + n2 + 2.0))));
    double atMode =
        p == 0 || p == 1
            ? 1
            : Binomial.term(mode, n1, p)
                * Binomial.term(total - mode, n2, p)
                / Binomial.term(total, n1 + n2, p);
    // Tables beyond the point where a term is negligible are rejected unseen.
    terms[(int) mode] = atMode;
    long top = mode;
    while (top < high && terms[(int) top] > NEGLIGIBLE * atMode) {
      terms[(int) top + 1] = terms[(int) top] * up(n1, n2, total, top);
      top++;
    }
    long bottom = mode;
    while (bottom > low && terms[(int) bottom] > NEGLIGIBLE * atMode) {
      bottom--;
      terms[(int) bottom] = terms[(int) bottom + 1] / up(n1, n2, total, bottom);
    }
    double left = alpha * TIE;
    while (bottom <= top) {
      double below = twoSided ? terms[(int) bottom] : Double.POSITIVE_INFINITY;
      double above = terms[(int) top];
      boolean both =
          twoSided
              && bottom < top
              && below <= above * SAME_PROBABILITY
              && above <= below * SAME_PROBABILITY;
      double taken = both ? below + above : Math.min(below, above);
      if (taken > left) {
        break;
      }
      left -= taken;
      if (both) {
        bottom++;
        top--;
      } else if (below < above) {
        bottom++;
      } else {
        top--;
      }
    }
    return new long[] {twoSided ? bottom : low, top};
  }

  /** Probability of a count of x + 1 in the first group over that of x, the total given. */
  private static double up(long n1, long n2, long total, long x) {
    return (double) (n1 - x) * (total - x) / ((double) (x + 1) * (n2 - total + x + 1));
  }

  /** A statistic of two counts that rises with the first and falls with the second. */
  public interface Statistic {
    /**
     * The statistic.
     *
     * @param x1 successes in the first group
     * @param n1 size of the first group
     * @param x2 successes in the second group
     * @param n2 size of the second group
     */
    double of(double x1, double n1, double x2, double n2);
  }

  /**
   * Power of a test of two shares that rejects for a large statistic, by all its outcomes. The
   * rejections of a statistic that rises with one count and falls with the other (Barnard 1947) end
   * at a border that rises too, so that one walk along it finds them all.
   *
   * @param n1 size of the first group, from 1
   * @param n2 size of the second group, from 1
   * @param p1 true share in the first group
   * @param p2 true share in the second group
   * @param statistic rejects where it is at least the critical value, but for rounding
   * @param critical critical value, above 0
   * @param twoSided whether a statistic at or below minus the critical value rejects too
   */
  public static double twoShares(
      long n1,
      long n2,
      double p1,
      double p2,
      Statistic statistic,
      double critical,
      boolean twoSided) {
    double limit = critical * (1 - 1e-12);
    long[] window = Binomial.window(n1, p1);
    long last = -1; // largest second count that rejects for a larger first share
    long first = 0; // smallest that rejects for a smaller one
    double power = 0;
    for (long x1 = window[0]; x1 <= window[1]; x1++) {
      while (last < n2 && statistic.of(x1, n1, last + 1, n2) >= limit) {
        last++;
      }
      double row = Binomial.atMost(last, n2, p2);
      if (twoSided) {
        while (first <= n2 && statistic.of(x1, n1, first, n2) > -limit) {
          first++;
        }
        row += Binomial.atLeast(first, n2, p2);
      }
      power += Binomial.term(x1, n1, p1) * row;
    }
    return Math.min(1, power);
  }

  private static double[] terms(long n, double p, long[] window) {
    double[] terms = new double[(int) (window[1] - window[0] + 1)];
    for (int i = 0; i < terms.length; i++) {
      terms[i] = Binomial.term(window[0] + i, n, p);
    }
    return terms;
  }
}
