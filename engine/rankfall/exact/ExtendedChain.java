package rankfall.exact;

import java.util.ArrayList;
import java.util.List;

/**
 * A chain over a ring with further free variables, which stand before the algebraic numbers.
 *
 * @param base the chain that was extended
 * @param chain the same rules over the larger ring
 */
public record ExtendedChain(Chain base, Chain chain) {

  /**
   * The extension of a chain.
   *
   * @param base any chain
   * @param names of the new variables, none of the ring's
   * @return the new variables are free
   */
  public static ExtendedChain of(Chain base, List<String> names) {
    Variables old = base.variables();
    List<String> all = new ArrayList<>(old.names().subList(0, old.indeterminates()));
    all.addAll(names);
    all.addAll(old.names().subList(old.indeterminates(), old.count()));
    Variables ring = new Variables(all, old.numbers());
    List<Chain.Rule> rules =
        base.rules().stream()
            .map(
                r ->
                    new Chain.Rule(
                        ring.index(old.names().get(r.variable())),
                        NumberFieldTower.inRing(r.equation(), ring)))
            .toList();
    return new ExtendedChain(base, new Chain(ring, rules));
  }

  /** A polynomial of the base ring in the larger one. */
  public Polynomial up(Polynomial p) {
    return NumberFieldTower.inRing(p, chain.variables());
  }

  /** A quotient of the base ring in the larger one. */
  public RationalFunction up(RationalFunction f) {
    return RationalFunction.of(up(f.numerator()), up(f.denominator()));
  }

  /**
   * A polynomial of the larger ring in the base ring.
   *
   * @throws IllegalArgumentException if a new variable occurs
   */
  public Polynomial down(Polynomial p) {
    return NumberFieldTower.inRing(p, base.variables());
  }

  /** A new variable. */
  public Polynomial variable(String name) {
    return Polynomial.variable(chain.variables(), name);
  }
}
