package dev.holdfast.design;

import java.util.List;

/** Says why no effect could be built from a plan's inputs. */
public final class InputException extends RuntimeException {
  private static final long serialVersionUID = 1L;

  private final transient List<String> inputs;
  private final boolean missing;

  private InputException(List<String> inputs, boolean missing, String message) {
    super(message);
    this.inputs = List.copyOf(inputs);
    this.missing = missing;
  }

  /**
   * Something needed is not given.
   *
   * @param message what is needed, as a phrase: "an SD (sd, or sds by group)"
   * @param inputs the keys that would supply it
   */
  public static InputException missing(String message, String... inputs) {
    return new InputException(List.of(inputs), true, message);
  }

  /**
   * Something given cannot be.
   *
   * @param input the key
   * @param message what is wrong, as a sentence without a full stop
   */
  public static InputException unfit(String input, String message) {
    return new InputException(List.of(input), false, message);
  }

  /** The keys concerned. */
  public List<String> inputs() {
    return inputs;
  }

  /** Whether something is missing rather than wrong. */
  public boolean isMissing() {
    return missing;
  }
}
