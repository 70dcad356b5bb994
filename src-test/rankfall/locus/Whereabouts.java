package rankfall.locus;

import java.math.BigInteger;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import rankfall.Analysis;
import rankfall.exact.Polynomial;
import rankfall.exact.Term;

/**
 * In which strata of a family a point modulo a prime lies, by printed equations and exclusions
 * alone.
 */
final class Whereabouts {
  private final List<Analysis.Stratum> strata;
  private final Residues field;
  private final Map<Polynomial, List<Reduced>> reduced = new HashMap<>();

  Whereabouts(List<Analysis.Stratum> strata, Residues field) {
    this.strata = strata;
    this.field = field;
  }

  private record Reduced(long coefficient, int[] exponents) {}

  List<Analysis.Stratum> of(List<Long> point) {
    return strata.stream().filter(s -> contains(s, point)).toList();
  }

  private boolean contains(Analysis.Stratum s, List<Long> point) {
    return s.equations().stream().allMatch(p -> value(p, point) == 0)
        && s.exclusions().stream()
            .noneMatch(set -> set.stream().allMatch(p -> value(p, point) == 0));
  }

  long value(Polynomial p, List<Long> point) {
    long sum = 0;
    for (Reduced t : reduced.computeIfAbsent(p, this::reduced)) {
      long product = t.coefficient();
      for (int v = 0; v < t.exponents().length && product != 0; v++) {
        for (int k = 0; k < t.exponents()[v]; k++) {
          product = product * point.get(v) % field.prime();
        }
      }
      sum = (sum + product) % field.prime();
    }
    return sum;
  }

  private List<Reduced> reduced(Polynomial p) {
    return p.terms().stream()
        .map(
            t ->
                new Reduced(
                    field.of(t.coefficient()),
                    t.exponents().stream().mapToInt(Integer::intValue).toArray()))
        .toList();
  }

  /**
   * The largest absolute value that a printed polynomial takes, multiplied by its denominator,
   * where numerators and denominators are at most 2.
   */
  static BigInteger bound(List<Analysis.Stratum> strata) {
    return polynomials(strata)
        .map(
            p ->
                p.terms().stream()
                    .map(t -> t.coefficient().abs())
                    .reduce(BigInteger.ZERO, BigInteger::add)
                    .shiftLeft(2 * p.totalDegree()))
        .reduce(BigInteger.ZERO, BigInteger::max);
  }

  private static Stream<Polynomial> polynomials(List<Analysis.Stratum> strata) {
    return strata.stream()
        .flatMap(
            s ->
                Stream.concat(
                    s.equations().stream(), s.exclusions().stream().flatMap(List::stream)));
  }

  /** All integers that stand in the equations and exclusions. */
  static List<BigInteger> coefficients(List<Analysis.Stratum> strata) {
    return polynomials(strata)
        .flatMap(p -> p.terms().stream())
        .map(Term::coefficient)
        .collect(Collectors.toList());
  }
}
