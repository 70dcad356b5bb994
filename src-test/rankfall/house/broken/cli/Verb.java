package rankfall.house.broken.cli;

import io.pebbletemplates.pebble.PebbleEngine;
import org.apache.commons.csv.CSVFormat;
import rankfall.house.broken.exact.Matrix;

/** A verb that computes, writes and shows a stack. */
final class Verb {
  CSVFormat format;
  Matrix matrix;
  PebbleEngine engine;

  void fail(Exception e) {
    e.printStackTrace();
  }
}
