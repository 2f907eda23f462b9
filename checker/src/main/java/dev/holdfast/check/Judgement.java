package dev.holdfast.check;

import java.util.OptionalDouble;

/**
 * What came of judging a claim, before it is put into a report.
 *
 * @param verdict what became of it
 * @param computed what the assumptions give
 * @param method the method that gave it
 * @param decimals decimals at which it is compared
 * @param explanation why the verdict is no plain {@code holds}
 */
record Judgement(
    Verdict verdict, OptionalDouble computed, String method, int decimals, String explanation) {

  static Judgement notComputed(int decimals, String explanation) {
    return new Judgement(Verdict.NOT_COMPUTED, OptionalDouble.empty(), "", decimals, explanation);
  }
}
