package dev.holdfast.cli;

import java.io.IOException;
import java.util.Optional;

/**
 * A plan to check.
 *
 * @param path its path as it is reported
 * @param content what it holds
 * @param before what it held at an earlier revision
 */
record Job(String path, Content content, Optional<Before> before) {

  /** Content that is read when its turn comes. */
  interface Content {
    byte[] read() throws IOException;
  }

  /**
   * Content at a revision.
   *
   * @param bytes the content
   * @param revision the revision, as the user named it
   */
  record Before(byte[] bytes, String revision) {}
}
