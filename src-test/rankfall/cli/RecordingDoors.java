package rankfall.cli;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.Reader;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Consumer;
import org.apache.commons.numbers.fraction.BigFraction;
import rankfall.Analysis;
import rankfall.Budget;
import rankfall.spec.Spec;
import rankfall.spec.SpecResult;

/** Rooms that answer what a test lays out, and note what is written. */
final class RecordingDoors implements FrontDoors {
  final List<SpecResult> documents = new ArrayList<>();
  final List<String> written = Collections.synchronizedList(new ArrayList<>());
  Analysis.Status status = Analysis.Status.COMPLETE;
  boolean broken;

  @Override
  public List<SpecResult> read(Path file) {
    return List.copyOf(documents);
  }

  @Override
  public String schema() {
    return "{}\n";
  }

  @Override
  public Analysis analyse(Spec spec, Budget budget) {
    if (broken) {
      throw new IllegalStateException("a promise is broken");
    }
    String message = status == Analysis.Status.COMPLETE ? "" : "time is up";
    return new Analysis(spec, "1", status, message, List.of(), List.of(), Optional.empty());
  }

  @Override
  public void writeFamily(Path out, Analysis analysis) {
    written.add(analysis.spec().family());
  }

  @Override
  public void writeSummary(Path out, List<Outcome> outcomes) {
    written.add("summary of " + outcomes.size());
  }

  @Override
  public PointAnswers points(Spec spec, PointForm form) {
    return new PointAnswers() {
      @Override
      public String head() {
        return form == PointForm.CSV ? "CSV\n" : "";
      }

      @Override
      public Answer at(Map<String, BigFraction> point) {
        boolean good = !point.containsValue(BigFraction.ZERO);
        return new Answer(form + " " + point + "\n", good);
      }

      @Override
      public void atEach(Reader table, Consumer<Answer> out) throws IOException {
        BufferedReader rows = new BufferedReader(table);
        for (String row = rows.readLine(); row != null; row = rows.readLine()) {
          boolean good = !row.equals("x");
          out.accept(new Answer((good ? row : "error") + "\n", good));
        }
      }
    };
  }
}
