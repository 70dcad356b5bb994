package rankfall.cli;

import picocli.CommandLine.IVersionProvider;
import rankfall.Version;

/** The one line that {@code --version} prints. */
final class VersionLine implements IVersionProvider {
  @Override
  public String[] getVersion() {
    return new String[] {"rankfall " + Version.text()};
  }
}
