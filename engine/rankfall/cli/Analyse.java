package rankfall.cli;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.util.List;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Parameters;
import rankfall.Analysis;
import rankfall.Budget;
import rankfall.spec.Spec;
import rankfall.spec.SpecResult;

/** Analyses families and writes their reports. */
@Command(
    name = "analyse",
    aliases = "analyze",
    description = "Finds where the Killing form of each family degenerates and writes the reports.")
final class Analyse implements Callable<Integer> {
  private final FrontDoors doors;

  @Parameters(
      arity = "1..*",
      paramLabel = "SPEC",
      description = "A spec file, or a folder with *.yaml and *.yml files.")
  private List<Path> specs;

  @Option(
      names = "--out",
      paramLabel = "DIR",
      defaultValue = "reports",
      description = "The folder that takes the reports (default: ${DEFAULT-VALUE}).")
  private Path out;

  @Option(
      names = "--threads",
      paramLabel = "N",
      description = "How many families at the same time (default: one a processor).")
  private int threads = Runtime.getRuntime().availableProcessors();

  @Option(
      names = "--budget",
      paramLabel = "TIME",
      defaultValue = "5m",
      converter = DurationText.class,
      description = "Time for each family, such as 60s, 5m, 1h (default: ${DEFAULT-VALUE}).")
  private Duration time;

  @Option(
      names = "--max-branches",
      paramLabel = "N",
      description = "How many cases of each family are looked at (default: ${DEFAULT-VALUE}).")
  private int branches = Budget.DEFAULT.branches();

  @SuppressWarnings("UnusedVariable") // declares options
  @Mixin
  private CommonOptions common;

  @picocli.CommandLine.Spec private CommandSpec self;

  Analyse(FrontDoors doors) {
    this.doors = doors;
  }

  @Override
  public Integer call() throws IOException, InterruptedException {
    if (threads < 1) {
      throw wrongCall("--threads wants a number from 1");
    }
    if (branches < 1) {
      throw wrongCall("--max-branches wants a number from 1");
    }
    if (Files.exists(out) && !Files.isDirectory(out)) {
      throw wrongCall("--out wants a folder, and '" + out + "' is a file");
    }
    doors.warmUp();
    Messages messages = new Messages(self.commandLine().getErr());
    List<SpecResult> documents =
        FamilyNames.distinct(SpecDocuments.of(doors, specs, self.commandLine()));
    Progress progress =
        new Progress(self.commandLine().getErr(), System.console() != null, documents.size());
    List<Outcome> outcomes = new Batch(this::one, threads, progress::ended).run(documents);
    doors.writeSummary(out, outcomes);
    return tell(outcomes, messages);
  }

  private Analysis one(Spec spec) throws Exception {
    Analysis analysis = doors.analyse(spec, new Budget(time, branches));
    doors.writeFamily(out, analysis);
    return analysis;
  }

  private int tell(List<Outcome> outcomes, Messages messages) {
    int complete = 0;
    for (Outcome outcome : outcomes) {
      if (outcome instanceof Outcome.Analysed analysed) {
        messages.shortcoming(analysed.analysis());
        complete += analysed.analysis().status() == Analysis.Status.COMPLETE ? 1 : 0;
      } else if (outcome instanceof Outcome.Refused refused) {
        messages.faults(refused.faulty());
      }
    }
    messages.line(
        Messages.count(outcomes.size(), "family", "families")
            + ", "
            + complete
            + " complete; the table over all is "
            + out.resolve("summary.csv"));
    return complete == outcomes.size() ? ExitStatus.DONE : ExitStatus.INCOMPLETE;
  }

  private ParameterException wrongCall(String message) {
    return new ParameterException(self.commandLine(), message);
  }
}
