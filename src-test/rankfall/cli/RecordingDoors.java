package rankfall.cli;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.Reader;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Collection;
import java.util.Collections;
import java.util.Iterator;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
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
  boolean warm;

  @Override
  public List<SpecResult> read(Path file) {
    return List.copyOf(documents);
  }

  @Override
  public String schema() {
    return "{}\n";
  }

  @Override
  public void warmUp() {
    warm = true;
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
  public Scanned scan(Spec spec, ScanOrder order, ScanProgress progress, Messages messages)
      throws IOException {
    if (broken) {
      throw new IOException("no room left");
    }
    if (order.points() instanceof ScanOrder.Axes axes && axes.text().equals("misfit")) {
      throw new IllegalArgumentException("no such parameter");
    }
    return new Scanned(order.out().isPresent() ? "" : order.points() + "\n", "done", true);
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
      public Optional<String> misfit(Collection<String> names) {
        return Set.copyOf(names).equals(Set.copyOf(spec.parameters()))
            ? Optional.empty()
            : Optional.of("want " + spec.parameters());
      }

      @Override
      public Iterator<Answer> atEach(Reader table) {
        return new BufferedReader(table)
            .lines()
            .map(
                row ->
                    row.equals("x") ? new Answer("error\n", false) : new Answer(row + "\n", true))
            .iterator();
      }
    };
  }
}
