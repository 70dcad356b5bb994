package rankfall.locus;

import java.math.BigInteger;
import java.util.List;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import rankfall.Analysis;
import rankfall.exact.Polynomial;
import rankfall.exact.Term;

/**
 * In which strata a point lies, by the printed equations and exclusions alone.
 *
 * @param strata of a family
 * @param field the integers modulo a prime; a large one stands for the rationals
 */
record Whereabouts(List<Analysis.Stratum> strata, Residues field) {

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
    for (Term t : p.terms()) {
      long product = field.of(t.coefficient());
      for (int v = 0; v < t.exponents().size(); v++) {
        for (int k = 0; k < t.exponents().get(v); k++) {
          product = product * point.get(v) % field.prime();
        }
      }
      sum = (sum + product) % field.prime();
    }
    return sum;
  }

  /** All integers that stand in the equations and exclusions. */
  static List<BigInteger> coefficients(List<Analysis.Stratum> strata) {
    return strata.stream()
        .flatMap(s -> Stream.concat(s.equations().stream(), s.exclusions().stream().flatMap(List::stream)))
        .flatMap(p -> p.terms().stream())
        .map(Term::coefficient)
        .collect(Collectors.toList());
  }
}
