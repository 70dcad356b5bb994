package rankfall;

import java.util.List;
import org.apache.commons.numbers.fraction.BigFraction;

/** The values of one name in a grid, at least one. */
public record ScanAxis(String name, List<BigFraction> values) {
  /** Copies the list. */
  public ScanAxis {
    values = List.copyOf(values);
  }
}
