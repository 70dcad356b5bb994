package rankfall.identify;

import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;

/**
 * The name of a Lie algebra up to isomorphism, or a description where it has no usual name.
 *
 * @param name the preferred one, for example {@code so(3) |x R^3}
 * @param otherNames names and remarks that are as right, for example {@code iso(3)}; distinct, in
 *     the order of preference, without the preferred one
 */
public record TypeName(String name, List<String> otherNames) {
  /** Copies the names; each is kept once. */
  public TypeName {
    Set<String> once = new LinkedHashSet<>(otherNames);
    once.remove(name);
    otherNames = List.copyOf(once);
  }

  /**
   * A name without others.
   *
   * @param name the only one
   * @return it alone
   */
  public static TypeName of(String name) {
    return new TypeName(name, List.of());
  }

  /**
   * This with more names, which come after those it has.
   *
   * @param more as right as the ones it has
   * @return each name once
   */
  public TypeName with(List<String> more) {
    Set<String> all = new LinkedHashSet<>(otherNames);
    all.addAll(more);
    return new TypeName(name, List.copyOf(all));
  }
}
