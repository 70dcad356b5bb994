package rankfall.cli;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.Callable;
import picocli.CommandLine;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Parameters;
import rankfall.scan.Shard;
import rankfall.spec.Spec;
import rankfall.spec.SpecException;
import rankfall.spec.SpecResult;

/** Says of many exact points of a family where they lie. */
@Command(
    name = "scan",
    description = "Finds rank, signature, region and name at many exact points of one family.")
final class Scan implements Callable<Integer> {
  private final FrontDoors doors;

  @Parameters(index = "0", paramLabel = "SPEC", description = "The spec file.")
  private Path file;

  @Option(
      names = "--family",
      paramLabel = "NAME",
      description = "The family, where the file describes several.")
  private Optional<String> family = Optional.empty();

  @Option(
      names = "--grid",
      paramLabel = "AXES",
      description =
          "Values of every parameter: bounds and number of points, or single values, such as"
              + " \"a=-2:2:401,b=1/2,c=0;1;2\" (default: the 'scan' of the spec).")
  private Optional<String> grid = Optional.empty();

  @Option(
      names = "--sample",
      paramLabel = "N",
      description = "So many points drawn uniformly from --range.")
  private Optional<Long> sample = Optional.empty();

  @Option(names = "--seed", paramLabel = "N", description = "Of the sample (default: 1).")
  private Optional<Long> seed = Optional.empty();

  @Option(
      names = "--range",
      paramLabel = "RANGES",
      description = "Bounds or a value of every parameter, such as \"a=-2:2,b=1/2\".")
  private Optional<String> range = Optional.empty();

  @Option(
      names = "--from",
      paramLabel = "FILE",
      description = "A CSV table of points, its header the parameters.")
  private Optional<Path> from = Optional.empty();

  @Option(
      names = "--out",
      paramLabel = "FILE",
      description = "The CSV table of the answers; compressed if the name ends in .gz.")
  private Optional<Path> out = Optional.empty();

  @Option(
      names = "--count",
      description = "Prints how many points fell in each region and on each locus, and no table.")
  private boolean count;

  @Option(
      names = "--columns",
      paramLabel = "NAMES",
      split = ",",
      description = "The columns of the table, such as a,b,rank,type (default: all).")
  private List<String> columns = List.of();

  @Option(
      names = "--resume",
      description = "Goes on where an interrupted run of the same call stopped.")
  private boolean resume;

  @Option(
      names = "--shard",
      paramLabel = "K/N",
      description = "The K-th of N parts of the points; the parts put together are the whole.")
  private Optional<String> shard = Optional.empty();

  @Option(
      names = "--threads",
      paramLabel = "N",
      description = "How many threads (default: one a processor).")
  private int threads = Runtime.getRuntime().availableProcessors();

  @Option(
      names = "--budget",
      paramLabel = "TIME",
      defaultValue = "5m",
      converter = DurationText.class,
      description = "Time for the analysis that comes first (default: ${DEFAULT-VALUE}).")
  private Duration budget;

  @SuppressWarnings("UnusedVariable") // declares options
  @Mixin
  private CommonOptions common;

  @CommandLine.Spec private CommandSpec self;

  Scan(FrontDoors doors) {
    this.doors = doors;
  }

  @Override
  public Integer call() throws IOException, InterruptedException {
    ScanOrder order = order();
    SpecResult document = chosen();
    Messages messages = new Messages(self.commandLine().getErr());
    if (document instanceof SpecResult.Faulty faulty) {
      messages.faults(faulty);
      return ExitStatus.INCOMPLETE;
    }
    Spec spec = ((SpecResult.Read) document).spec();
    try {
      return scan(spec, order, messages);
    } catch (SpecException e) {
      messages.faults(new SpecResult.Faulty(Optional.of(spec.family()), e.diagnostics()));
      return ExitStatus.INCOMPLETE;
    }
  }

  private int scan(Spec spec, ScanOrder order, Messages messages)
      throws SpecException, InterruptedException {
    ScanProgress progress = new ScanProgress(self.commandLine().getErr(), System.console() != null);
    try {
      FrontDoors.Scanned scanned = doors.scan(spec, order, progress, messages);
      progress.end();
      self.commandLine().getOut().print(scanned.table());
      self.commandLine().getOut().flush();
      messages.line(spec.family() + ": " + scanned.message());
      return scanned.good() ? ExitStatus.DONE : ExitStatus.INCOMPLETE;
    } catch (IllegalArgumentException e) {
      throw new ParameterException(self.commandLine(), e.getMessage(), e);
    } catch (IOException e) {
      progress.end();
      messages.line(unwritten(e));
      return ExitStatus.INCOMPLETE;
    }
  }

  private String unwritten(IOException e) {
    return out.isEmpty()
        ? Cause.oneLine(e)
        : "'"
            + out.get()
            + "' cannot be written ("
            + Cause.oneLine(e)
            + "); the rows so far are whole, --resume goes on after them";
  }

  private SpecResult chosen() throws IOException {
    List<SpecResult> documents = SpecDocuments.of(doors, List.of(file), self.commandLine());
    try {
      return FamilyChoice.of(documents, family);
    } catch (IllegalArgumentException e) {
      throw new ParameterException(self.commandLine(), e.getMessage(), e);
    }
  }

  private ScanOrder order() {
    if (count == out.isPresent()) {
      throw wrongCall("give --out FILE for a table, or --count for numbers of points");
    }
    if (count && (resume || !columns.isEmpty())) {
      throw wrongCall("--resume and --columns belong to --out");
    }
    if (threads < 1) {
      throw wrongCall("--threads wants a number from 1");
    }
    if (out.isPresent() && Files.isDirectory(out.get())) {
      throw wrongCall("--out wants a file, and '" + out.get() + "' is a folder");
    }
    if (out.isPresent() && !Files.isDirectory(out.get().toAbsolutePath().getParent())) {
      throw wrongCall("'" + out.get().toAbsolutePath().getParent() + "': no such folder");
    }
    return new ScanOrder(
        points(),
        out,
        columns.isEmpty() ? Optional.empty() : Optional.of(columns),
        resume,
        part(),
        threads,
        budget);
  }

  private ScanOrder.Points points() {
    int ways =
        (grid.isPresent() ? 1 : 0) + (sample.isPresent() ? 1 : 0) + (from.isPresent() ? 1 : 0);
    if (ways > 1) {
      throw wrongCall("--grid, --sample and --from name different points; choose one");
    }
    if (sample.isEmpty() && (range.isPresent() || seed.isPresent())) {
      throw wrongCall("--range and --seed belong to --sample");
    }
    if (sample.isPresent()) {
      if (sample.get() < 1) {
        throw wrongCall("--sample wants a number from 1");
      }
      if (range.isEmpty()) {
        throw wrongCall("--sample wants --range, such as --range \"a=-2:2,b=1/2\"");
      }
      return new ScanOrder.Drawn(sample.get(), seed.orElse(1L), range.get());
    }
    if (from.isPresent()) {
      if (!Files.isRegularFile(from.get())) {
        throw wrongCall("'" + from.get() + "': no such file");
      }
      return new ScanOrder.Listed(from.get());
    }
    return grid.isPresent() ? new ScanOrder.Axes(grid.get()) : new ScanOrder.DefaultGrid();
  }

  private Shard part() {
    try {
      return shard.isPresent() ? Shard.of(shard.get()) : Shard.WHOLE;
    } catch (IllegalArgumentException e) {
      throw new ParameterException(self.commandLine(), e.getMessage(), e);
    }
  }

  private ParameterException wrongCall(String message) {
    return new ParameterException(self.commandLine(), message);
  }
}
