package millrace.analytics.spark;

/** The version of the program, from its jar. */
final class ProgramVersion {
  private ProgramVersion() {}

  static String text() {
    String version = ProgramVersion.class.getPackage().getImplementationVersion();
    return version == null ? "development" : version;
  }
}
