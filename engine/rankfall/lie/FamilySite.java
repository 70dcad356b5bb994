package rankfall.lie;

import java.math.BigInteger;
import rankfall.exact.Chain;
import rankfall.exact.Polynomial;

/** A family at a point or at the general point of a set. */
public sealed interface FamilySite {
  /**
   * At a rational point, where no algebraic numbers occur.
   *
   * @param input the generators
   */
  record Rational(SpanInput<BigInteger> input) implements FamilySite {}

  /**
   * On a set, or at a point where algebraic numbers occur.
   *
   * @param chain the set; at a point the equations of the algebraic numbers
   * @param input the generators over the chain
   */
  record Algebraic(Chain chain, SpanInput<Polynomial> input) implements FamilySite {}

  /**
   * Nowhere on the family.
   *
   * @param reason off a relation, at a pole, outside the domain, or not a point; one line
   */
  record Outside(String reason) implements FamilySite {}
}
