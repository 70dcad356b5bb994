package rankfall;

import java.math.BigInteger;
import java.util.Collections;
import java.util.List;
import java.util.Optional;
import java.util.SortedMap;
import java.util.TreeMap;
import org.apache.commons.numbers.fraction.BigFraction;
import rankfall.Analysis.Coordinate;
import rankfall.Analysis.Stratum;
import rankfall.exact.Integers;
import rankfall.exact.Rationals;
import rankfall.identify.AlgebraNames;
import rankfall.identify.ExactAlgebra;
import rankfall.lie.StructureConstants;
import rankfall.locus.Contraction.Entry;

/**
 * The name of a contracted algebra.
 *
 * @param complex whether the ground is
 * @param dimension of the algebra
 * @param brackets its structure constants, as functions of the parameters
 */
record ContractedName(boolean complex, int dimension, List<Entry> brackets) {

  /**
   * The name.
   *
   * @param stratum gives the point at which constants that are not numbers are taken
   * @return empty if that point is not rational, or no name is proved
   */
  Optional<AlgebraType> at(Stratum stratum) {
    boolean numbers = brackets.stream().allMatch(e -> e.value().isConstant());
    Optional<List<BigFraction>> point = numbers ? Optional.of(List.of()) : rational(stratum);
    return point
        .map(p -> constants(brackets.stream().map(e -> value(e, p)).toList()))
        .map(c -> complex ? ExactAlgebra.complex(c) : ExactAlgebra.real(c))
        .flatMap(AlgebraNames::of)
        .map(n -> new AlgebraType(n.name(), n.otherNames(), numbers));
  }

  private static BigFraction value(Entry e, List<BigFraction> point) {
    return e.value().isConstant() ? e.value().constantValue() : e.value().at(point);
  }

  /** The witness, if it is real, rational and gives all coordinates of the constants. */
  private Optional<List<BigFraction>> rational(Stratum stratum) {
    int variables = brackets.get(0).value().numerator().variables().count();
    List<Coordinate> witness = stratum.witness();
    boolean whole =
        stratum.realPoints() == Analysis.RealPoints.YES
            && witness.size() == variables
            && witness.stream().noneMatch(c -> c.value().startsWith("root("));
    return whole
        ? Optional.of(witness.stream().map(c -> BigFraction.parse(c.value())).toList())
        : Optional.empty();
  }

  /** Times the common denominator, which is another basis of the same algebra. */
  private StructureConstants<BigInteger> constants(List<BigFraction> values) {
    BigInteger common =
        values.stream()
            .map(Rationals::denominator)
            .reduce(BigInteger.ONE, (a, b) -> a.divide(a.gcd(b)).multiply(b));
    SortedMap<StructureConstants.Pair, SortedMap<Integer, BigInteger>> out = new TreeMap<>();
    for (int k = 0; k < brackets.size(); k++) {
      Entry e = brackets.get(k);
      BigInteger c = Rationals.numerator(values.get(k).multiply(common));
      if (c.signum() != 0) {
        out.computeIfAbsent(new StructureConstants.Pair(e.left(), e.right()), x -> new TreeMap<>())
            .put(e.target(), c);
      }
    }
    return new StructureConstants<>(
        new Integers(),
        dimension,
        out,
        BigInteger.ONE,
        Collections.nCopies(dimension, BigInteger.ONE));
  }
}
