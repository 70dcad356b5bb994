package rankfall.scan;

import java.util.List;
import org.apache.commons.numbers.fraction.BigFraction;

/** Computes single points exactly, from the generators; may be asked from several threads. */
@FunctionalInterface
public interface DirectPoints {
  /**
   * What is known of a point by itself.
   *
   * @param point exact values, in the order of the names of the scan
   * @return without names of stratum and region
   */
  Finding at(List<BigFraction> point);
}
