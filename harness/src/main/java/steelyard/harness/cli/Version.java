package steelyard.harness.cli;

import picocli.CommandLine.IVersionProvider;

/** The version of the program. */
final class Version implements IVersionProvider {

  Version() {}

  static String text() {
    String version = Version.class.getPackage().getImplementationVersion();
    return version == null ? "development" : version;
  }

  @Override
  public String[] getVersion() {
    return new String[] {"steelyard " + text()};
  }
}
