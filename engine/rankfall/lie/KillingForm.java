package rankfall.lie;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.SortedMap;
import java.util.TreeMap;
import org.apache.commons.numbers.fraction.BigFraction;
import rankfall.exact.Chain;
import rankfall.exact.ChainFactoring;
import rankfall.exact.ChainFractions;
import rankfall.exact.Determinant;
import rankfall.exact.Factorization;
import rankfall.exact.Factorization.Factor;
import rankfall.exact.Polynomial;
import rankfall.exact.RationalFunction;

/**
 * The Killing form {@code kappa_ij = trace(ad_i ad_j)} of a basis at the general point of a set.
 *
 * @param chain the set
 * @param matrix n x n, symmetric, exact values; no denominator holds an algebraic function
 */
public record KillingForm(Chain chain, List<List<RationalFunction>> matrix) {
  /** Copies the matrix. */
  public KillingForm {
    matrix = matrix.stream().map(List::copyOf).toList();
  }

  /**
   * The form of an algebra.
   *
   * @param chain the set over which the constants are given
   * @param constants brackets of the basis e_i
   * @param traces the traces of the C, not reduced
   * @return the form in the basis e_i
   */
  public static KillingForm of(
      Chain chain, StructureConstants<Polynomial> constants, List<List<Polynomial>> traces) {
    Polynomial squared = constants.denominator().times(constants.denominator());
    int n = constants.dimension();
    RationalFunction[][] k = new RationalFunction[n][n];
    for (int i = 0; i < n; i++) {
      for (int j = i; j < n; j++) {
        Polynomial below = squared.times(constants.scale().get(i)).times(constants.scale().get(j));
        k[i][j] = ChainFractions.canonical(chain, traces.get(i).get(j), below);
        k[j][i] = k[i][j];
      }
    }
    List<List<RationalFunction>> rows = new ArrayList<>();
    for (RationalFunction[] row : k) {
      rows.add(List.of(row));
    }
    return new KillingForm(chain, rows);
  }

  /** Index sets, ascending, between which all entries are 0. */
  public List<List<Integer>> blocks() {
    return ZeroPattern.blocks(matrix.size(), (i, j) -> !matrix.get(i).get(j).isZero());
  }

  /**
   * The determinant, block by block, as quotient of factored polynomials; a product of blocks is
   * never expanded.
   *
   * @return empty if it is 0
   */
  public Optional<FactoredQuotient> determinant() {
    return determinant(chain, matrix);
  }

  /**
   * The determinant of a symmetric matrix, block by block, as quotient of factored polynomials.
   *
   * @param chain the set over which the entries are given
   * @param matrix exact values whose denominators hold no algebraic function
   * @return empty if it is 0
   */
  static Optional<FactoredQuotient> determinant(Chain chain, List<List<RationalFunction>> matrix) {
    FactoredQuotient product = FactoredQuotient.one();
    for (List<Integer> block :
        ZeroPattern.blocks(matrix.size(), (i, j) -> !matrix.get(i).get(j).isZero())) {
      Optional<FactoredQuotient> d = ofBlock(chain, ZeroPattern.part(matrix, block));
      if (d.isEmpty()) {
        return d;
      }
      product = product.times(d.get());
    }
    return Optional.of(product);
  }

  private static Optional<FactoredQuotient> ofBlock(
      Chain chain, List<List<RationalFunction>> block) {
    Polynomial common = chain.one();
    for (List<RationalFunction> row : block) {
      for (RationalFunction f : row) {
        Polynomial d = f.denominator();
        common = common.times(d.over(common.gcd(d)));
      }
    }
    List<List<Polynomial>> cleared = new ArrayList<>();
    for (List<RationalFunction> entries : block) {
      List<Polynomial> row = new ArrayList<>();
      for (RationalFunction f : entries) {
        row.add(f.numerator().times(common.over(f.denominator())));
      }
      cleared.add(row);
    }
    RationalFunction d =
        ChainFractions.canonical(chain, Determinant.of(chain.variables(), cleared), chain.one());
    if (d.isZero()) {
      return Optional.empty();
    }
    FactoredQuotient below = FactoredQuotient.of(ChainFactoring.factorization(chain, common));
    return Optional.of(
        FactoredQuotient.of(ChainFactoring.factorization(chain, d.numerator()))
            .over(FactoredQuotient.of(ChainFactoring.factorization(chain, d.denominator())))
            .over(below.pow(block.size())));
  }

  /** The factors of a determinant's numerator. */
  public static List<Factor> zeros(FactoredQuotient determinant) {
    return determinant.numerator().factors();
  }

  /** A quotient of factored polynomials without a common factor. */
  public record FactoredQuotient(Factorization numerator, Factorization denominator) {
    static FactoredQuotient one() {
      return of(new Factorization(BigFraction.ONE, List.of()));
    }

    static FactoredQuotient of(Factorization f) {
      return new FactoredQuotient(f, new Factorization(BigFraction.ONE, List.of()));
    }

    FactoredQuotient pow(int exponent) {
      return new FactoredQuotient(power(numerator, exponent), power(denominator, exponent));
    }

    private static Factorization power(Factorization f, int exponent) {
      return new Factorization(
          f.unit().pow(exponent),
          f.factors().stream()
              .map(x -> new Factor(x.base(), x.multiplicity() * exponent))
              .filter(x -> x.multiplicity() > 0)
              .toList());
    }

    FactoredQuotient over(FactoredQuotient q) {
      return times(new FactoredQuotient(q.denominator, q.numerator));
    }

    FactoredQuotient times(FactoredQuotient q) {
      SortedMap<String, Factor> exponents = new TreeMap<>();
      numerator.factors().forEach(x -> add(exponents, x, 1));
      q.numerator.factors().forEach(x -> add(exponents, x, 1));
      denominator.factors().forEach(x -> add(exponents, x, -1));
      q.denominator.factors().forEach(x -> add(exponents, x, -1));
      var unit =
          numerator
              .unit()
              .multiply(q.numerator.unit())
              .divide(denominator.unit().multiply(q.denominator.unit()));
      List<Factor> above = new ArrayList<>();
      List<Factor> below = new ArrayList<>();
      for (Factor x : exponents.values()) {
        if (x.multiplicity() > 0) {
          above.add(x);
        } else if (x.multiplicity() < 0) {
          below.add(new Factor(x.base(), -x.multiplicity()));
        }
      }
      return new FactoredQuotient(
          new Factorization(BigFraction.of(unit.getNumerator()), above),
          new Factorization(BigFraction.of(unit.getDenominator()), below));
    }

    private static void add(SortedMap<String, Factor> exponents, Factor x, int sign) {
      exponents.merge(
          key(x.base()),
          new Factor(x.base(), sign * x.multiplicity()),
          (a, b) -> new Factor(a.base(), a.multiplicity() + b.multiplicity()));
    }

    /** Shorter polynomials first. */
    private static String key(Polynomial p) {
      return String.format(Locale.ROOT, "%04d %06d %s", p.totalDegree(), p.termCount(), p);
    }
  }
}
