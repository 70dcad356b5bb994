package rankfall.cli;

import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.PrintWriter;
import java.io.Reader;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.util.Iterator;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.Callable;
import org.apache.commons.numbers.fraction.BigFraction;
import picocli.CommandLine;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Parameters;
import rankfall.cli.FrontDoors.Answer;
import rankfall.cli.FrontDoors.PointAnswers;
import rankfall.cli.FrontDoors.PointForm;
import rankfall.spec.Spec;
import rankfall.spec.SpecException;
import rankfall.spec.SpecResult;

/** States the facts of a family at exact points. */
@Command(name = "point", description = "States the facts of one family at exact points.")
final class Point implements Callable<Integer> {
  private static final String STANDARD_INPUT = "-";

  private final FrontDoors doors;

  @Parameters(index = "0", paramLabel = "SPEC", description = "The spec file.")
  private Path file;

  @Parameters(
      index = "1..*",
      arity = "0..*",
      paramLabel = "NAME=VALUE",
      description =
          "An exact value for each parameter, such as a=1 b=-3/2 c=0.25, or \"cos(t)=3/5\".")
  private List<String> values = List.of();

  @Option(
      names = "--family",
      paramLabel = "NAME",
      description = "The family, where the file describes several.")
  private Optional<String> family = Optional.empty();

  @Option(
      names = "--from",
      paramLabel = "FILE",
      description = "A CSV table of points, its header the parameters; - is standard input.")
  private Optional<String> from = Optional.empty();

  @Option(names = "--json", description = "One JSON object a point, on one line.")
  private boolean json;

  @Option(names = "--csv", description = "One CSV row a point.")
  private boolean csv;

  @SuppressWarnings("UnusedVariable") // declares options
  @Mixin
  private CommonOptions common;

  @CommandLine.Spec private CommandSpec self;

  Point(FrontDoors doors) {
    this.doors = doors;
  }

  @Override
  public Integer call() throws IOException {
    if (from.isPresent() && !values.isEmpty()) {
      throw wrongCall("give the values in the call, or --from a table, not both");
    }
    if (json && csv) {
      throw wrongCall("--json and --csv are two forms; choose one");
    }
    SpecResult document = chosen();
    Messages messages = new Messages(self.commandLine().getErr());
    if (document instanceof SpecResult.Faulty faulty) {
      messages.faults(faulty);
      return ExitStatus.INCOMPLETE;
    }
    Spec spec = ((SpecResult.Read) document).spec();
    try {
      return answer(spec) ? ExitStatus.DONE : ExitStatus.INCOMPLETE;
    } catch (SpecException e) {
      messages.faults(new SpecResult.Faulty(Optional.of(spec.family()), e.diagnostics()));
      return ExitStatus.INCOMPLETE;
    }
  }

  private SpecResult chosen() throws IOException {
    List<SpecResult> documents = SpecDocuments.of(doors, List.of(file), self.commandLine());
    try {
      return FamilyChoice.of(documents, family);
    } catch (IllegalArgumentException e) {
      throw new ParameterException(self.commandLine(), e.getMessage(), e);
    }
  }

  private boolean answer(Spec spec) throws IOException, SpecException {
    PrintWriter out = self.commandLine().getOut();
    try {
      return from.isPresent() ? rows(spec, from.get(), out) : single(spec, out);
    } finally {
      out.flush();
    }
  }

  private boolean rows(Spec spec, String name, PrintWriter out) throws IOException, SpecException {
    try (Reader table = open(name)) {
      PointAnswers answers = doors.points(spec, pointForm());
      Iterator<Answer> rows = rows(answers, table);
      out.print(answers.head());
      boolean good = true;
      while (rows.hasNext()) {
        good &= print(rows.next(), out);
      }
      return good;
    }
  }

  private Iterator<Answer> rows(PointAnswers answers, Reader table) throws IOException {
    try {
      return answers.atEach(table);
    } catch (IllegalArgumentException e) {
      throw new ParameterException(self.commandLine(), e.getMessage(), e);
    }
  }

  private boolean single(Spec spec, PrintWriter out) throws SpecException {
    Map<String, BigFraction> point = assigned();
    PointAnswers answers = doors.points(spec, pointForm());
    Optional<String> misfit = answers.misfit(point.keySet());
    if (misfit.isPresent()) {
      throw wrongCall(misfit.get());
    }
    out.print(answers.head());
    return print(answers.at(point), out);
  }

  private Map<String, BigFraction> assigned() {
    try {
      return Assignments.of(values);
    } catch (IllegalArgumentException e) {
      throw new ParameterException(self.commandLine(), e.getMessage(), e);
    }
  }

  private static boolean print(Answer answer, PrintWriter out) {
    out.print(answer.text());
    return answer.good();
  }

  private Reader open(String name) throws IOException {
    try {
      InputStream in =
          name.equals(STANDARD_INPUT) ? System.in : Files.newInputStream(Path.of(name));
      return new InputStreamReader(in, StandardCharsets.UTF_8);
    } catch (NoSuchFileException e) {
      throw new ParameterException(self.commandLine(), "'" + name + "': no such file", e);
    }
  }

  private PointForm pointForm() {
    if (json) {
      return PointForm.JSON;
    }
    return csv ? PointForm.CSV : PointForm.TEXT;
  }

  private ParameterException wrongCall(String message) {
    return new ParameterException(self.commandLine(), message);
  }
}
