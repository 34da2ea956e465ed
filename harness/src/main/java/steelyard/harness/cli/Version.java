package steelyard.harness.cli;

import picocli.CommandLine.IVersionProvider;
import steelyard.harness.execution.ProgramVersion;

/** The version of the program. */
final class Version implements IVersionProvider {

  Version() {}

  @Override
  public String[] getVersion() {
    return new String[] {"steelyard " + ProgramVersion.text()};
  }
}
