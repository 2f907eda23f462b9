package dev.holdfast.history;

/** Why a repository could not be read, as a sentence with its remedy. */
public final class GitException extends Exception {
  private static final long serialVersionUID = 1L;

  /** A reason. */
  public GitException(String message) {
    super(message);
  }
}
