package rankfall.report;

import rankfall.PointResult;

/** A form in which answers at points are written. */
public sealed interface PointWriter permits PointText, PointJson, PointCsv {
  /**
   * What stands before the first answer.
   *
   * @return whole lines, or nothing
   */
  String head();

  /**
   * One answer.
   *
   * @param result facts or a failure
   * @return whole lines, each with its line end
   */
  String text(PointResult result);
}
