package dev.holdfast.cli;

/** How the program ends. */
final class Status {
  /** Everything holds. */
  static final int HOLDS = 0;

  /** Something blocks. */
  static final int BLOCKS = 1;

  /** Something was not checked. */
  static final int NOT_CHECKED = 2;

  /** A fault of the program. */
  static final int FAULT = 3;

  private Status() {}
}
