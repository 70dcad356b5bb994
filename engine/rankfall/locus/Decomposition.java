package rankfall.locus;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.stream.Collectors;
import rankfall.exact.Chain;
import rankfall.exact.GroebnerBasis;
import rankfall.exact.Polynomial;

/**
 * The irreducible components over the rationals (with the algebraic numbers of the ring) of the
 * zeros of polynomials, off the zeros of others: the prime decomposition of a radical.
 *
 * <p>The closures of the pieces that {@link Splitter} finds, each that lies in no other one. Before
 * anybody sees it the result is checked by {@link DecompositionCheck}, which does not rest on the
 * way it was found.
 *
 * @param pieces disjoint, irreducible and locally closed; they cover exactly the zeros
 * @param components by dimension, greatest first, then by text of their equations
 * @param certificate what the check says
 */
public record Decomposition(
    List<Piece> pieces, List<Component> components, Certificate certificate) {
  /** Copies the lists. */
  public Decomposition {
    pieces = List.copyOf(pieces);
    components = List.copyOf(components);
  }

  /**
   * A component.
   *
   * @param chain its general point
   * @param equations the reduced basis of its prime ideal; empty for the whole space
   */
  public record Component(Chain chain, List<Polynomial> equations) {
    /** Copies the equations. */
    public Component {
      equations = List.copyOf(equations);
    }

    private String text() {
      return equations.stream().map(Polynomial::toString).collect(Collectors.joining("; "));
    }
  }

  /** What the check of a decomposition says; a failed one is no value but an exception. */
  public sealed interface Certificate {}

  /** Every part of the check was done and held. */
  public record Certified() implements Certificate {}

  /**
   * The components are prime and the input vanishes on them, but whether they cover all of its
   * zeros was not proved a second time.
   *
   * @param reason why not
   */
  public record NotCertified(String reason) implements Certificate {}

  /**
   * The decomposition.
   *
   * @param constants the chain of the algebraic numbers of the ring
   * @param equations all vanish
   * @param meter ends the work early
   * @return checked
   * @throws IllegalStateException if the check fails
   */
  public static Decomposition of(Chain constants, List<Polynomial> equations, Meter meter) {
    return of(constants, equations, List.of(), meter);
  }

  /**
   * The decomposition of the closure of what is left without the zeros of other polynomials.
   *
   * @param constants the chain of the algebraic numbers of the ring
   * @param equations all vanish
   * @param nonZero none vanishes
   * @param meter ends the work early
   * @return checked
   * @throws IllegalStateException if the check fails
   */
  public static Decomposition of(
      Chain constants, List<Polynomial> equations, List<Polynomial> nonZero, Meter meter) {
    List<Piece> pieces = new Splitter(constants, meter).zeros(equations, nonZero);
    Closures closures = new Closures(constants);
    List<Component> components = new ArrayList<>();
    for (Chain c : closures.maximal(pieces.stream().map(Piece::chain).toList())) {
      components.add(new Component(c, closures.ideal(c)));
    }
    components.sort(
        Comparator.comparingInt((Component c) -> -c.chain().dimension())
            .thenComparing(Component::text));
    Certificate certificate =
        new DecompositionCheck(constants, new GroebnerBasis(constants), meter)
            .of(equations, nonZero, components);
    return new Decomposition(pieces, components, certificate);
  }
}
