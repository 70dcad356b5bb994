package rankfall.house.broken;

import rankfall.house.broken.report.Writer;

/** A root class that reaches up to report. */
public final class Truth {
  Writer writer;
}
