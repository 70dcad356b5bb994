package rankfall.cli;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import java.util.concurrent.Callable;
import picocli.CommandLine;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Parameters;
import rankfall.spec.SpecResult;

/** Reads specs and reports their faults; computes nothing, so that an editor can call it. */
@Command(name = "check", description = "Reads specs and reports every fault in them.")
final class Check implements Callable<Integer> {
  private final FrontDoors doors;

  @Parameters(
      arity = "0..*",
      paramLabel = "SPEC",
      description = "A spec file, or a folder with *.yaml and *.yml files.")
  private List<Path> specs = List.of();

  @Option(
      names = "--schema",
      description = "Prints the JSON schema of the spec format, for an editor, and reads nothing.")
  private boolean schema;

  @SuppressWarnings("UnusedVariable") // declares options
  @Mixin
  private CommonOptions common;

  @CommandLine.Spec private CommandSpec self;

  Check(FrontDoors doors) {
    this.doors = doors;
  }

  @Override
  public Integer call() throws IOException {
    CommandLine command = self.commandLine();
    if (schema == !specs.isEmpty()) {
      throw new ParameterException(command, "name the specs to check, or give --schema alone");
    }
    if (schema) {
      command.getOut().print(doors.schema());
      command.getOut().flush();
      return ExitStatus.DONE;
    }
    List<SpecResult> documents = FamilyNames.distinct(SpecDocuments.of(doors, specs, command));
    Messages messages = new Messages(command.getErr());
    messages.faults(documents);
    long faulty = documents.stream().filter(SpecResult.Faulty.class::isInstance).count();
    messages.line(
        Messages.count(documents.size(), "family", "families")
            + " read, "
            + (faulty == 0 ? "no fault" : faulty + " faulty"));
    return faulty == 0 ? ExitStatus.DONE : ExitStatus.INCOMPLETE;
  }
}
