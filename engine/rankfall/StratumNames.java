package rankfall;

import java.util.Map;
import java.util.Optional;
import org.apache.commons.numbers.fraction.BigFraction;

/** Knows in which stratum of its family a point lies. */
@FunctionalInterface
public interface StratumNames {
  /** Knows no stratum. */
  StratumNames NONE = point -> Optional.empty();

  /**
   * The stratum of a point.
   *
   * @param point a point of the family at which its span is an algebra, values by coordinate
   * @return the name of the stratum, such as {@code S1}; empty where no strata are known
   */
  Optional<String> of(Map<String, BigFraction> point);
}
