package dev.holdfast.cli;

/** The version of the program. */
final class Version {
  private Version() {}

  /** Program, version and the Java that runs it, on one line. */
  static String line() {
    String version = Version.class.getPackage().getImplementationVersion();
    return "holdfast "
        + (version == null ? "(not packaged)" : version)
        + ", Java "
        + System.getProperty("java.version");
  }
}
