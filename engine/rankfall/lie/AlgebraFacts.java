package rankfall.lie;

import java.util.List;
import rankfall.exact.Domain;

/**
 * What a Lie algebra is, as far as linear algebra over the ring of its constants tells; the same
 * over every larger field.
 *
 * @param dimension n, 0 or more
 * @param killing the Killing matrix of the constants C, exact values, not in normal form
 * @param derivedSeries the derived series
 * @param lowerCentralSeries the lower central series
 * @param derived [g, g]
 * @param centre the centre
 * @param radical the largest solvable ideal
 * @param nilradical the largest nilpotent ideal
 * @param unimodular whether tr ad x = 0 for all x
 * @param <E> the elements of the ring
 */
public record AlgebraFacts<E>(
    int dimension,
    List<List<E>> killing,
    Series<E> derivedSeries,
    Series<E> lowerCentralSeries,
    Subspace<E> derived,
    Subspace<E> centre,
    Subspace<E> radical,
    Subspace<E> nilradical,
    boolean unimodular) {

  /** The facts of an algebra over a ring of characteristic 0. */
  public static <E> AlgebraFacts<E> of(StructureConstants<E> constants) {
    return of(LieBracket.of(constants));
  }

  /** The facts of an algebra over a ring of characteristic 0. */
  public static <E> AlgebraFacts<E> of(LieBracket<E> bracket) {
    List<List<E>> kappa = PlainKilling.of(bracket);
    Series<E> derivedSeries = Series.derived(bracket);
    Subspace<E> derived =
        derivedSeries.terms().size() > 1 ? derivedSeries.terms().get(1) : derivedSeries.next();
    Subspace<E> radical = Ideals.radical(bracket, kappa, derived);
    return new AlgebraFacts<>(
        bracket.dimension(),
        kappa,
        derivedSeries,
        Series.lowerCentral(bracket),
        derived,
        Ideals.centre(bracket),
        radical,
        Nilradical.of(bracket, radical),
        isUnimodular(bracket));
  }

  private static <E> boolean isUnimodular(LieBracket<E> bracket) {
    Domain<E> domain = bracket.domain();
    for (int i = 0; i < bracket.dimension(); i++) {
      E trace = domain.zero();
      for (int k = 0; k < bracket.dimension(); k++) {
        trace = domain.plus(trace, bracket.of(i, k).getOrDefault(k, domain.zero()));
      }
      if (!new Vectors<>(domain).vanishes(trace)) {
        return false;
      }
    }
    return true;
  }

  /** The kernel of the Killing form, an ideal; worked out at each call. */
  public Subspace<E> killingKernel() {
    Domain<E> domain = radical.domain();
    return Subspace.kernel(domain, dimension, new Vectors<>(domain).rows(killing));
  }

  /** The rank of the Killing form; worked out at each call. */
  public int killingRank() {
    return dimension - killingKernel().dimension();
  }

  /** Whether all brackets are 0. */
  public boolean abelian() {
    return derived.dimension() == 0;
  }

  /** Whether the lower central series ends in 0. */
  public boolean nilpotent() {
    return lowerCentralSeries.reachesZero();
  }

  /** Whether the radical is everything (Cartan's criterion: kappa(g, [g, g]) = 0). */
  public boolean solvable() {
    return radical.dimension() == dimension;
  }

  /** Whether the radical is 0 and n positive. */
  public boolean semisimple() {
    return dimension > 0 && radical.dimension() == 0;
  }

  /** Whether the radical is the centre. */
  public boolean reductive() {
    return radical.dimension() == centre.dimension();
  }
}
