package rankfall.cli;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import rankfall.Analysis;
import rankfall.Budget;
import rankfall.Engine;
import rankfall.Points;
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
  @Override
  public List<SpecResult> read(Path file) throws IOException {
    return SpecReader.read(file.toString(), Files.readAllBytes(file));
  }

  @Override
  public String schema() {
    return SpecSchema.text();
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
    Points points = Points.of(spec);
    return new ProgramPoints(points, writer(points, form));
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
