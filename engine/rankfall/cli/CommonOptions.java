package rankfall.cli;

import picocli.CommandLine.Command;
import picocli.CommandLine.Option;

/** The two options that every verb has; picocli answers them before the verb runs. */
@Command(
    versionProvider = VersionLine.class,
    descriptionHeading = "%n",
    parameterListHeading = "%n",
    optionListHeading = "%n",
    exitCodeListHeading = "%nExit status:%n",
    exitCodeList = {
      "0:all done",
      "1:some family or point failed or stayed incomplete",
      "2:the call itself was wrong"
    })
final class CommonOptions {
  @Option(
      names = {"-h", "--help"},
      usageHelp = true,
      description = "Prints this help.")
  @SuppressWarnings("UnusedVariable") // read by the command line
  private boolean help;

  @Option(
      names = {"-V", "--version"},
      versionHelp = true,
      description = "Prints the version.")
  @SuppressWarnings("UnusedVariable") // read by the command line
  private boolean version;
}
