package dev.holdfast.cli;

/** Why a command cannot do what it was asked, as a sentence with its remedy: status 2. */
final class UnusableException extends RuntimeException {
  private static final long serialVersionUID = 1L;

  UnusableException(String message) {
    super(message);
  }
}
