package rankfall.cli;

import java.io.PrintWriter;
import java.util.List;
import rankfall.Analysis;
import rankfall.spec.Diagnostic;
import rankfall.spec.DiagnosticText;
import rankfall.spec.SpecResult;

/** What a person is told about specs and families, on standard error. */
final class Messages {
  private final PrintWriter err;

  Messages(PrintWriter err) {
    this.err = err;
  }

  /** Shows every fault of every faulty document, in order. */
  void faults(List<SpecResult> results) {
    for (SpecResult result : results) {
      if (result instanceof SpecResult.Faulty faulty) {
        faults(faulty);
      }
    }
  }

  /** Shows every fault of one document. */
  void faults(SpecResult.Faulty faulty) {
    for (Diagnostic fault : faulty.diagnostics()) {
      err.print(DiagnosticText.of(fault));
    }
    err.flush();
  }

  /** Says of a family that is not complete what its report says first. */
  void shortcoming(Analysis analysis) {
    if (analysis.status() != Analysis.Status.COMPLETE) {
      err.println(analysis.spec().family() + ": " + word(analysis) + ": " + analysis.message());
    }
  }

  /** One line of our own words. */
  void line(String text) {
    err.println(text);
  }

  private static String word(Analysis analysis) {
    return analysis.status() == Analysis.Status.FAILED ? "failed" : "incomplete";
  }

  /** A number with the noun it counts. */
  static String count(long number, String one, String many) {
    return number + " " + (number == 1 ? one : many);
  }
}
