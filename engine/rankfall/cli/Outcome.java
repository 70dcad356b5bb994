package rankfall.cli;

import rankfall.Analysis;
import rankfall.spec.SpecResult;

/** What became of one document of a batch. */
sealed interface Outcome {
  /** A spec that was analysed; its status says how far. */
  record Analysed(Analysis analysis) implements Outcome {}

  /** A document that could not be read. */
  record Refused(SpecResult.Faulty faulty) implements Outcome {}
}
