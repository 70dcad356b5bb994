package rankfall.exact;

import java.util.HashSet;
import java.util.List;

/**
 * The ordered variables of a ring of polynomials with integer coefficients.
 *
 * @param names distinct names; earlier ones are greater in every order of monomials
 * @param numbers how many of them, the last ones, stand for algebraic numbers: these count as
 *     coefficients where terms are ordered or printed
 */
public record Variables(List<String> names, int numbers) {
  /** Copies the names and checks that they differ. */
  public Variables {
    names = List.copyOf(names);
    if (numbers < 0 || numbers > names.size()) {
      throw new IllegalArgumentException(numbers + " numbers among " + names);
    }
    if (new HashSet<>(names).size() != names.size()) {
      throw new IllegalArgumentException("a variable is named twice in " + names);
    }
  }

  /**
   * Variables without algebraic numbers.
   *
   * @param names distinct names
   */
  public Variables(List<String> names) {
    this(names, 0);
  }

  /** The number of variables that do not stand for algebraic numbers; they come first. */
  public int indeterminates() {
    return names.size() - numbers;
  }

  /**
   * The number of variables.
   *
   * @return 0 or more
   */
  public int count() {
    return names.size();
  }

  /**
   * The position of a variable.
   *
   * @param name one of the names
   * @return from 0
   * @throws IllegalArgumentException if there is no such variable
   */
  public int index(String name) {
    int at = names.indexOf(name);
    if (at < 0) {
      throw new IllegalArgumentException("no variable " + name + " among " + names);
    }
    return at;
  }
}
