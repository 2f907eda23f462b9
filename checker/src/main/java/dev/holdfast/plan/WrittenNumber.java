package dev.holdfast.plan;

import java.math.BigDecimal;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * The written form of numbers. A plan reads numbers as the JSON schema of YAML 1.2 does; every
 * spelling that versions of YAML read differently is a text there, and gets a hint here.
 */
final class WrittenNumber {
  private static final Pattern NUMBER =
      Pattern.compile("-?(?:0|[1-9][0-9]*)(?:\\.[0-9]*)?(?:[eE]([-+]?[0-9]+))?");
  private static final Pattern LOOSE =
      Pattern.compile("([-+]?)([0-9][0-9_]*|)(?:[.,]([0-9_]*))?(?:[eE]([-+]?[0-9]+))?( ?%)?");
  private static final Pattern GROUPED =
      Pattern.compile("[-+]?[1-9][0-9]{0,2}(?:[, '][0-9]{3})+(?:\\.[0-9]+)?");

  /** Beyond this power of ten every number but zero is infinite or nothing as a double. */
  private static final int LARGEST_EXPONENT = 400;

  /** More digits than these are no number that somebody wrote. */
  private static final int LONGEST = 200;

  private WrittenNumber() {}

  /** Whether a number token is finite as a double and not rounded away to zero. */
  static boolean isUsable(String written) {
    Matcher number = NUMBER.matcher(written);
    if (written.length() > LONGEST || !number.matches()) {
      return false;
    }
    if (number.group(1) != null) {
      String exponent = number.group(1).replaceFirst("^[-+]?0*", "");
      if (exponent.length() > 3
          || !exponent.isEmpty() && Integer.parseInt(exponent) > LARGEST_EXPONENT) {
        return false;
      }
    }
    double value = Double.parseDouble(written);
    return Double.isFinite(value) && (value != 0 || new BigDecimal(written).signum() == 0);
  }

  /** Digits written after the decimal point, the exponent taken into account. */
  static int decimals(String written) {
    return Math.max(0, new BigDecimal(written).scale());
  }

  /**
   * How the number that a text probably means is written in a plan; both ways, if there are two.
   */
  static Optional<String> meantBy(String text) {
    String trimmed = text.strip();
    if (trimmed.length() > LONGEST || trimmed.isEmpty()) {
      return Optional.empty();
    }
    if (NUMBER.matcher(trimmed).matches()) {
      return usable(trimmed);
    }
    if (GROUPED.matcher(trimmed).matches()) {
      Optional<String> whole = usable(withoutPlus(trimmed.replaceAll("[, ']", "")));
      boolean ambiguous = trimmed.matches("[-+]?[0-9]+,[0-9]{3}");
      return ambiguous
          ? whole.map(each -> each + " or " + withoutPlus(trimmed).replace(',', '.'))
          : whole;
    }
    Matcher loose = LOOSE.matcher(trimmed);
    if (!loose.matches()) {
      return Optional.empty();
    }
    String whole = loose.group(2).replace("_", "").replaceFirst("^0+(?=[0-9])", "");
    String fraction = loose.group(3) == null ? "" : loose.group(3).replace("_", "");
    if (whole.isEmpty() && fraction.isEmpty()) {
      return Optional.empty();
    }
    String number =
        (loose.group(1).equals("-") ? "-" : "")
            + (whole.isEmpty() ? "0" : whole)
            + (fraction.isEmpty() ? "" : "." + fraction)
            + (loose.group(4) == null ? "" : "e" + loose.group(4));
    if (!isUsable(number)) {
      return Optional.empty();
    }
    return Optional.of(
        loose.group(5) == null ? number : new BigDecimal(number).movePointLeft(2).toPlainString());
  }

  private static String withoutPlus(String text) {
    return text.startsWith("+") ? text.substring(1) : text;
  }

  private static Optional<String> usable(String number) {
    return isUsable(number) ? Optional.of(number) : Optional.empty();
  }
}
