package dev.holdfast.report;

import dev.holdfast.check.Numbers;
import dev.holdfast.design.Step;
import java.util.HashMap;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** Puts the numbers of a step into its formula. */
final class Substitution {
  private static final Pattern SYMBOL = Pattern.compile("[A-Za-z][A-Za-z0-9]*");

  private Substitution() {}

  /** The formula, and below it the same with numbers where that says more. */
  static String write(Step step, String indent) {
    int equals = step.formula().indexOf('=');
    String left = step.formula().substring(0, equals).strip();
    String right = step.formula().substring(equals + 1).strip();
    int aside = right.indexOf(", ");
    String formula = aside < 0 ? right : right.substring(0, aside);
    Map<String, Double> values = new HashMap<>();
    step.terms().forEach(term -> values.put(term.symbol(), term.value()));
    Matcher matcher = SYMBOL.matcher(formula);
    StringBuilder put = new StringBuilder();
    boolean words = formula.matches(".*[A-Za-z] [a-z].*");
    while (matcher.find()) {
      Double value = values.get(matcher.group());
      matcher.appendReplacement(
          put, Matcher.quoteReplacement(value == null ? matcher.group() : Numbers.brief(value)));
    }
    matcher.appendTail(put);
    StringBuilder text = new StringBuilder();
    text.append(indent).append(step.what()).append(":  ").append(left).append(" = ").append(right);
    text.append('\n').append(indent).append("    ");
    if (!words && !put.toString().equals(formula)) {
      text.append("= ").append(put).append("  ");
    }
    return text.append("= ")
        .append(Numbers.significant(step.value(), 6, java.math.RoundingMode.HALF_UP))
        .append('\n')
        .toString();
  }
}
