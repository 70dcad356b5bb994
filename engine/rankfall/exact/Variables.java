package rankfall.exact;

import java.util.HashSet;
import java.util.List;

/**
 * The ordered variables of a ring of polynomials with integer coefficients.
 *
 * @param names distinct names; earlier ones are greater in every order of monomials
 */
public record Variables(List<String> names) {
  /** Copies the names and checks that they differ. */
  public Variables {
    names = List.copyOf(names);
    if (new HashSet<>(names).size() != names.size()) {
      throw new IllegalArgumentException("a variable is named twice in " + names);
    }
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
