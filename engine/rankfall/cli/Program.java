package rankfall.cli;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.util.List;
import rankfall.Analysis;
import rankfall.Budget;
import rankfall.Engine;
import rankfall.Points;
import rankfall.ScanFamily;
import rankfall.StratumLookup;
import rankfall.report.PointCsv;
import rankfall.report.PointJson;
import rankfall.report.PointText;
import rankfall.report.PointWriter;
import rankfall.report.ReportWriter;
import rankfall.report.SummaryRow;
import rankfall.spec.Diagnostic;
import rankfall.spec.Spec;
import rankfall.spec.SpecException;
import rankfall.spec.SpecReader;
import rankfall.spec.SpecResult;
import rankfall.spec.SpecSchema;

/** The rooms of the program itself behind the verbs. */
final class Program implements FrontDoors {
  /** What may be spent to learn the names of strata before points are answered. */
  private static final Budget FOR_NAMES =
      new Budget(Duration.ofSeconds(30), Budget.DEFAULT.branches());

  @Override
  public List<SpecResult> read(Path file) throws IOException {
    return SpecReader.read(file.toString(), Files.readAllBytes(file));
  }

  @Override
  public String schema() {
    return SpecSchema.text();
  }

  @Override
  public void warmUp() {
    Thread thread = new Thread(Engine::warmUp, "warm-up");
    thread.setDaemon(true);
    thread.start();
  }

  @Override
  public Analysis analyse(Spec spec, Budget budget) throws SpecException {
    return Engine.analyse(spec, budget);
  }

  @Override
  public void writeFamily(Path out, Analysis analysis) throws IOException {
    ReportWriter.write(analysis, out);
  }

  @Override
  public void writeSummary(Path out, List<Outcome> outcomes) throws IOException {
    ReportWriter.writeSummary(outcomes.stream().map(Program::row).toList(), out);
  }

  @Override
  public PointAnswers points(Spec spec, PointForm form) throws SpecException {
    Points points = Points.of(spec, StratumLookup.of(spec, Engine.withoutGrid(spec, FOR_NAMES)));
    return new ProgramPoints(points, writer(points, form));
  }

  @Override
  public Scanned scan(Spec spec, ScanOrder order, ScanProgress progress, Messages messages)
      throws SpecException, IOException, InterruptedException {
    Budget budget = new Budget(order.budget(), Budget.DEFAULT.branches());
    return new ProgramScan(
            ScanFamily.of(spec), order, progress, () -> known(spec, budget, messages))
        .run();
  }

  /** An analysis of a spec that is known to describe a family. */
  private static Analysis known(Spec spec, Budget budget, Messages messages) {
    try {
      Analysis analysis = Engine.withoutGrid(spec, budget);
      messages.shortcoming(analysis);
      return analysis;
    } catch (SpecException e) {
      throw new IllegalStateException(e);
    }
  }

  private static PointWriter writer(Points points, PointForm form) {
    return switch (form) {
      case TEXT -> new PointText();
      case JSON -> new PointJson();
      case CSV -> new PointCsv(points.names());
    };
  }

  private static SummaryRow row(Outcome outcome) {
    if (outcome instanceof Outcome.Analysed analysed) {
      return SummaryRow.of(analysed.analysis());
    }
    SpecResult.Faulty faulty = ((Outcome.Refused) outcome).faulty();
    Diagnostic first = faulty.diagnostics().get(0);
    return SummaryRow.failed(
        faulty.family().orElseGet(() -> first.place().file()), first.headline());
  }
}
