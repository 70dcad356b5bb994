package rankfall.scan;

import java.util.List;
import java.util.Set;
import rankfall.exact.Variables;

/**
 * What the variables of a family are at the points of a set: values of the point, algebraic
 * numbers, or, where a parameter is given as 0 in place of functions of it, 0 or 1.
 *
 * @param names of the values of a point, in order
 * @param zeros variables that are 0 at all points
 * @param ones variables that are 1 at all points
 * @param numbers tells the signs of numbers
 */
public record Frame(List<String> names, Set<String> zeros, Set<String> ones, NumberSigns numbers) {
  /** Copies the names. */
  public Frame {
    names = List.copyOf(names);
    zeros = Set.copyOf(zeros);
    ones = Set.copyOf(ones);
  }

  /**
   * Where the variables of a ring stand among the names.
   *
   * @return a place a variable; -1 for algebraic numbers and for what is 0 or 1
   * @throws IllegalArgumentException if the frame does not know a variable
   */
  int[] places(Variables ring) {
    int[] out = new int[ring.count()];
    for (int v = 0; v < out.length; v++) {
      String name = ring.names().get(v);
      boolean fixed = zeros.contains(name) || ones.contains(name);
      out[v] = v >= ring.indeterminates() || fixed ? -1 : names.indexOf(name);
      if (out[v] < 0 && !fixed && v < ring.indeterminates()) {
        throw new IllegalArgumentException("no value for " + name);
      }
    }
    return out;
  }

  boolean isZero(String variable) {
    return zeros.contains(variable);
  }
}
