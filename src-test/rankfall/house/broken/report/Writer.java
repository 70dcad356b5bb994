package rankfall.house.broken.report;

import rankfall.house.broken.lie.TraceHelper;

/** A writer that computes. */
public final class Writer {
  TraceHelper traces;
}
