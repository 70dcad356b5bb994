package rankfall.identify;

import java.math.BigInteger;
import java.util.List;
import java.util.Optional;
import java.util.SortedMap;
import java.util.TreeMap;
import java.util.function.Function;
import rankfall.exact.Chain;
import rankfall.exact.Domain;
import rankfall.exact.Integers;
import rankfall.exact.Polynomial;
import rankfall.exact.Variables;
import rankfall.lie.SignRule;
import rankfall.lie.StructureConstants;
import rankfall.locus.PointAlgebra;

/**
 * A Lie algebra over the field of a chain: at an exact point the numbers of the family.
 *
 * <p>With an order of the field it is the algebra over the real numbers that the constants define;
 * without, the algebra over the complex numbers.
 *
 * @param chain the field; no free variable occurs in the constants
 * @param constants over the chain
 * @param signs the order of the field; empty for a complex algebra
 */
public record ExactAlgebra(
    Chain chain, StructureConstants<Polynomial> constants, Optional<SignRule<Polynomial>> signs) {

  /** A real algebra over algebraic numbers. */
  public static ExactAlgebra real(
      Chain chain, StructureConstants<Polynomial> constants, SignRule<Polynomial> signs) {
    return new ExactAlgebra(chain, constants, Optional.of(signs));
  }

  /** A complex algebra over algebraic numbers. */
  public static ExactAlgebra complex(Chain chain, StructureConstants<Polynomial> constants) {
    return new ExactAlgebra(chain, constants, Optional.empty());
  }

  /** A real algebra with rational constants. */
  public static ExactAlgebra real(StructureConstants<BigInteger> constants) {
    return real(RATIONAL, lifted(constants), p -> p.constantValue().signum());
  }

  /** A complex algebra with rational constants. */
  public static ExactAlgebra complex(StructureConstants<BigInteger> constants) {
    return complex(RATIONAL, lifted(constants));
  }

  /** The real algebra of a family at a point. */
  @SuppressWarnings("unchecked") // the domain tells which numbers there are
  public static ExactAlgebra of(PointAlgebra<?> algebra) {
    if (algebra.constants().domain() instanceof Chain chain) {
      PointAlgebra<Polynomial> a = (PointAlgebra<Polynomial>) algebra;
      Chain positive = positive(chain, a.signs());
      StructureConstants<Polynomial> c = a.constants();
      return real(
          positive,
          new StructureConstants<>(
              positive, c.dimension(), c.brackets(), positive.one(), c.scale()),
          a.signs());
    }
    return real(((PointAlgebra<BigInteger>) algebra).constants());
  }

  /** The same field, with rules whose initials are positive: reduction keeps signs then. */
  private static Chain positive(Chain chain, SignRule<Polynomial> signs) {
    return new Chain(
        chain.variables(),
        chain.rules().stream()
            .map(
                r ->
                    signs.signum(r.initial()) < 0
                        ? new Chain.Rule(r.variable(), r.equation().negate())
                        : r)
            .toList());
  }

  private static final Chain RATIONAL = Chain.free(new Variables(List.of()));

  private static StructureConstants<Polynomial> lifted(StructureConstants<BigInteger> constants) {
    return mapped(constants, RATIONAL, c -> Polynomial.constant(RATIONAL.variables(), c));
  }

  /** The dimension of the algebra. */
  public int dimension() {
    return constants.dimension();
  }

  /** Whether the algebra is taken over the complex numbers. */
  public boolean complex() {
    return signs.isEmpty();
  }

  /** The constants C as integers, where they are. */
  Optional<StructureConstants<BigInteger>> integral() {
    boolean all =
        constants.brackets().values().stream()
            .allMatch(row -> row.values().stream().allMatch(Polynomial::isConstant));
    return all
        ? Optional.of(mapped(constants, new Integers(), Polynomial::constantValue))
        : Optional.empty();
  }

  /** The constants C in another ring; denominator and scale become 1. */
  private static <A, B> StructureConstants<B> mapped(
      StructureConstants<A> from, Domain<B> domain, Function<A, B> map) {
    SortedMap<StructureConstants.Pair, SortedMap<Integer, B>> out = new TreeMap<>();
    from.brackets()
        .forEach(
            (pair, row) -> {
              SortedMap<Integer, B> image = new TreeMap<>();
              row.forEach((k, c) -> image.put(k, map.apply(c)));
              out.put(pair, image);
            });
    return new StructureConstants<>(
        domain,
        from.dimension(),
        out,
        domain.one(),
        java.util.Collections.nCopies(from.dimension(), domain.one()));
  }
}
