package rankfall.spec;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/** Gathers the faults of one document while it is read. */
final class Faults {
  /** More than this many faults of one spec help nobody. */
  static final int LIMIT = 20;

  private static final Comparator<Diagnostic> TEXT_ORDER =
      Comparator.comparingInt((Diagnostic d) -> d.place().line())
          .thenComparingInt(d -> d.place().column());

  private final FileText file;
  private final List<Diagnostic> found = new ArrayList<>();

  Faults(FileText file) {
    this.file = file;
  }

  void add(Place place, String cause, String advice) {
    add(SpecFault.of(place, cause, advice));
  }

  void add(SpecFault fault) {
    found.add(file.diagnostic(fault));
  }

  /** Runs one step of the reading; a fault in it is kept and the reading goes on. */
  void gather(Runnable step) {
    try {
      step.run();
    } catch (SpecFault fault) {
      add(fault);
    }
  }

  boolean none() {
    return found.isEmpty();
  }

  /** At most {@link #LIMIT} faults in the order of the text, each once. */
  List<Diagnostic> inTextOrder() {
    return found.stream().sorted(TEXT_ORDER).distinct().limit(LIMIT).toList();
  }
}
