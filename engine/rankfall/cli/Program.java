package rankfall.cli;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import rankfall.Analysis;
import rankfall.Budget;
import rankfall.spec.Spec;
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
  public Analysis analyse(Spec spec, Budget budget) {
    throw absent("Engine");
  }

  @Override
  public void writeFamily(Path out, Analysis analysis) {
    throw absent("report");
  }

  @Override
  public void writeSummary(Path out, List<Outcome> outcomes) {
    throw absent("report");
  }

  @Override
  public PointAnswers points(Spec spec, PointForm form) {
    throw absent("Engine");
  }

  private static IllegalStateException absent(String room) {
    return new IllegalStateException(room + " is not joined to the command line");
  }
}
