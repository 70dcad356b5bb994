package rankfall.identify;

import java.util.Optional;
import java.util.function.Function;
import rankfall.lie.StructureConstants;

/**
 * The name of an algebra by its simple ideals, its radical and the action on it.
 *
 * <p>Semisimple algebras are sums; reductive ones have {@code + R^k}. Otherwise the largest direct
 * factors are split off: the simple ideals that commute with the radical (the derived algebra of
 * the centraliser of the radical) and a central subspace outside the derived algebra. What is left
 * is a semidirect sum, which is named where the name tells the algebra, and described where not.
 */
public final class LeviNames {
  private LeviNames() {}

  /**
   * The name, solvable direct factors described by their nilradical.
   *
   * @param algebra at a point
   */
  public static TypeName of(ExactAlgebra algebra) {
    return of(algebra, a -> Optional.empty());
  }

  /**
   * The name.
   *
   * @param algebra at a point
   * @param solvable names solvable algebras that are not abelian, where it can
   */
  public static TypeName of(
      ExactAlgebra algebra, Function<ExactAlgebra, Optional<TypeName>> solvable) {
    return Ground.over(
        algebra,
        new Ground.Question<TypeName>() {
          @Override
          public <E> TypeName ask(Ground<E> ground, StructureConstants<E> constants) {
            return new LeviName<>(ground, solvable).of(constants);
          }
        });
  }

  /**
   * The name of the Levi factor, the algebra modulo its radical.
   *
   * @param algebra at a point
   * @return empty for a solvable algebra
   */
  public static Optional<TypeName> factor(ExactAlgebra algebra) {
    return Ground.over(
        algebra,
        new Ground.Question<Optional<TypeName>>() {
          @Override
          public <E> Optional<TypeName> ask(Ground<E> ground, StructureConstants<E> constants) {
            return new LeviName<>(ground, a -> Optional.empty()).factor(constants);
          }
        });
  }

  /**
   * Whether the Killing form is negative semidefinite and its kernel is the centre: the algebra is
   * a sum of a compact semisimple algebra and an abelian one, the algebra of a compact group.
   *
   * @param algebra at a point; never true for a complex algebra
   */
  public static boolean compactTypeAndCentre(ExactAlgebra algebra) {
    return !algebra.complex()
        && Ground.over(
            algebra,
            new Ground.Question<Boolean>() {
              @Override
              public <E> Boolean ask(Ground<E> ground, StructureConstants<E> constants) {
                return new LeviName<>(ground, a -> Optional.empty())
                    .compactTypeAndCentre(constants);
              }
            });
  }
}
