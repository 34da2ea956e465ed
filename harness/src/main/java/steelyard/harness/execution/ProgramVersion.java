package steelyard.harness.execution;

/** The version of the harness. */
public final class ProgramVersion {
  private ProgramVersion() {}

  /** Returns it, or that it is being developed where it does not run from its jar. */
  public static String text() {
    String version = ProgramVersion.class.getPackage().getImplementationVersion();
    return version == null ? "development" : version;
  }
}
