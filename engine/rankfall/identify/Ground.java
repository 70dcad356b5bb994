package rankfall.identify;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Optional;
import java.util.SortedMap;
import java.util.TreeMap;
import java.util.function.Function;
import java.util.function.UnaryOperator;
import rankfall.exact.Chain;
import rankfall.exact.ChainFractions;
import rankfall.exact.Domain;
import rankfall.exact.Elimination;
import rankfall.exact.Integers;
import rankfall.exact.Polynomial;
import rankfall.exact.RationalFunction;
import rankfall.lie.CharacteristicPolynomial;
import rankfall.lie.SignRule;
import rankfall.lie.Signature;
import rankfall.lie.StructureConstants;

/**
 * The ring over which an algebra at a point is computed: the integers where its constants are
 * integers, else the polynomials in its algebraic numbers.
 *
 * @param domain the ring
 * @param chain its field
 * @param signs the order; empty for complex algebras
 * @param lift the polynomial that an element is
 * @param lower the element that a polynomial over the chain is
 * @param shorter equal elements, shorter where that needs no common factor
 * @param division quotients with an integer below, which keeps numbers of the field short
 * @param <E> the elements
 */
record Ground<E>(
    Domain<E> domain,
    Chain chain,
    Optional<SignRule<E>> signs,
    Function<E, Polynomial> lift,
    Function<Polynomial, E> lower,
    UnaryOperator<List<E>> shorter,
    Division<E> division) {

  /** Divides many elements by one that is not 0. */
  interface Division<E> {
    /**
     * Quotients over a common denominator.
     *
     * @return numerators, then the denominator, which is an integer
     */
    List<E> of(List<E> numerators, E denominator);
  }

  private static List<BigInteger> integers(List<BigInteger> numerators, BigInteger denominator) {
    List<BigInteger> all = new ArrayList<>(numerators);
    all.add(denominator);
    return new Integers().normal(all).entries();
  }

  private static List<Polynomial> polynomials(
      Chain chain, List<Polynomial> numerators, Polynomial denominator) {
    if (denominator.isConstant()) {
      List<Polynomial> all = new ArrayList<>(numerators);
      all.add(denominator);
      return new NumberField(chain).primitive(all);
    }
    List<RationalFunction> quotients =
        numerators.stream().map(p -> ChainFractions.canonical(chain, p, denominator)).toList();
    Polynomial common = chain.one();
    for (RationalFunction q : quotients) {
      common = common.times(q.denominator().over(common.gcd(q.denominator())));
    }
    List<Polynomial> out = new ArrayList<>();
    for (RationalFunction q : quotients) {
      out.add(q.numerator().times(common.over(q.denominator())));
    }
    out.add(common);
    return out;
  }

  /** What is asked over any ground. */
  interface Question<R> {
    <E> R ask(Ground<E> ground, StructureConstants<E> constants);
  }

  /** Asks over the cheapest ground. */
  static <R> R over(ExactAlgebra algebra, Question<R> question) {
    Chain chain = algebra.chain();
    Optional<StructureConstants<BigInteger>> integral = algebra.integral();
    if (integral.isPresent()) {
      Ground<BigInteger> ground =
          new Ground<>(
              new Integers(),
              Chain.free(chain.variables()),
              algebra.signs().map(s -> BigInteger::signum),
              c -> Polynomial.constant(chain.variables(), c),
              Polynomial::constantValue,
              UnaryOperator.identity(),
              Ground::integers);
      return question.ask(ground, integral.get());
    }
    Ground<Polynomial> ground = of(chain, algebra.signs());
    StructureConstants<Polynomial> c = algebra.constants();
    return question.ask(ground, plain(ground.domain, c.dimension(), c.brackets()));
  }

  /** The numbers of a chain. */
  static Ground<Polynomial> of(Chain chain, Optional<SignRule<Polynomial>> signs) {
    boolean monic = chain.rules().stream().allMatch(r -> r.initial().isOne());
    return new Ground<>(
        new NumberField(chain),
        chain,
        signs,
        Function.identity(),
        Function.identity(),
        monic ? chain::reduced : UnaryOperator.identity(),
        (above, below) -> polynomials(chain, above, below));
  }

  /** The constants C over the chain; denominator and scale become 1. */
  StructureConstants<Polynomial> lifted(StructureConstants<E> constants) {
    SortedMap<StructureConstants.Pair, SortedMap<Integer, Polynomial>> out = new TreeMap<>();
    constants
        .brackets()
        .forEach(
            (pair, row) -> {
              SortedMap<Integer, Polynomial> image = new TreeMap<>();
              row.forEach((k, c) -> image.put(k, lift.apply(c)));
              out.put(pair, image);
            });
    return plain(chain, constants.dimension(), out);
  }

  /** Constants whose denominator and scale are 1. */
  static <F> StructureConstants<F> plain(
      Domain<F> domain, int n, SortedMap<StructureConstants.Pair, SortedMap<Integer, F>> brackets) {
    return new StructureConstants<>(
        domain, n, brackets, domain.one(), Collections.nCopies(n, domain.one()));
  }

  /** The signature of a form; the order must be there. */
  Signature signature(List<List<E>> matrix) {
    return Signature.of(
        CharacteristicPolynomial.byBlocks(domain, matrix.stream().map(shorter).toList()),
        signs.orElseThrow());
  }

  /** An integer as an element. */
  E integer(BigInteger value) {
    return lower.apply(Polynomial.constant(chain.variables(), value));
  }

  /** The sum of products. */
  E pair(SortedMap<Integer, E> x, SortedMap<Integer, E> y) {
    E sum = domain.zero();
    for (var e : x.entrySet()) {
      E other = y.get(e.getKey());
      if (other != null) {
        sum = domain.plus(sum, domain.times(e.getValue(), other));
      }
    }
    return sum;
  }

  /** The sum of multiples of vectors. */
  SortedMap<Integer, E> combination(
      SortedMap<Integer, E> weights, List<? extends SortedMap<Integer, E>> of) {
    SortedMap<Integer, E> sum = new TreeMap<>();
    weights.forEach((j, w) -> add(sum, w, of.get(j)));
    return sum;
  }

  /** Adds a multiple of a vector to a vector, which is changed. */
  void add(SortedMap<Integer, E> sum, E factor, SortedMap<Integer, E> x) {
    x.forEach(
        (k, v) -> {
          E product = domain.times(factor, v);
          sum.merge(k, product, domain::plus);
        });
    sum.values().removeIf(domain::isZero);
  }

  /** A proportional vector in normal form. */
  SortedMap<Integer, E> normal(SortedMap<Integer, E> x) {
    if (x.isEmpty()) {
      return x;
    }
    List<E> entries = domain.normal(new ArrayList<>(x.values())).entries();
    SortedMap<Integer, E> out = new TreeMap<>();
    int at = 0;
    for (Integer k : x.keySet()) {
      E e = entries.get(at++);
      if (!domain.isZero(e)) {
        out.put(k, e);
      }
    }
    return out;
  }

  /** The entries of a dense row that are not plainly 0. */
  SortedMap<Integer, E> sparse(List<E> row) {
    SortedMap<Integer, E> out = new TreeMap<>();
    for (int k = 0; k < row.size(); k++) {
      if (!domain.isZero(row.get(k))) {
        out.put(k, row.get(k));
      }
    }
    return out;
  }

  /** Whether a value is 0, in normal form or not. */
  boolean vanishes(E value) {
    return domain.isZero(value) || domain.isZero(domain.normal(List.of(value)).entries().get(0));
  }

  /**
   * The solution X of A X = B with a common denominator.
   *
   * @param a square sparse rows, invertible
   * @param b as many sparse rows
   * @param columns of b
   * @return {@code denominator * X}, sparse rows, and the denominator
   */
  Quotient<E> solve(List<SortedMap<Integer, E>> a, List<SortedMap<Integer, E>> b, int columns) {
    int n = a.size();
    List<SortedMap<Integer, E>> rows = new ArrayList<>();
    for (int i = 0; i < n; i++) {
      SortedMap<Integer, E> row = new TreeMap<>(a.get(i));
      b.get(i).forEach((k, v) -> row.put(n + k, v));
      rows.add(row);
    }
    Reduced<E> reduced = reduced(rows, n + columns, n);
    if (reduced.pivots.size() < n) {
      throw new ArithmeticException("the matrix has no inverse");
    }
    E denominator = reduced.common(this);
    List<SortedMap<Integer, E>> out = new ArrayList<>();
    for (int i = 0; i < n; i++) {
      E factor = reduced.cofactor(this, denominator, i);
      SortedMap<Integer, E> row = new TreeMap<>();
      reduced.rows.get(i).tailMap(n).forEach((k, v) -> row.put(k - n, domain.times(factor, v)));
      out.add(row);
    }
    return new Quotient<>(out, denominator);
  }

  /** Rows in reduced echelon form whose pivots are integers. */
  Reduced<E> reduced(List<SortedMap<Integer, E>> rows, int columns, int pivotColumns) {
    var echelon = Elimination.of(domain, rows, columns, pivotColumns, false);
    List<SortedMap<Integer, E>> out = new ArrayList<>();
    for (int k = 0; k < echelon.rank(); k++) {
      SortedMap<Integer, E> row = echelon.rows().get(k);
      out.add(over(row, row.get(echelon.pivots().get(k))));
    }
    return new Reduced<>(echelon.pivots(), out);
  }

  /** A proportional vector: the quotient by an element that is not 0, times an integer. */
  SortedMap<Integer, E> over(SortedMap<Integer, E> x, E divisor) {
    List<E> values = division.of(new ArrayList<>(x.values()), divisor);
    SortedMap<Integer, E> out = new TreeMap<>();
    int at = 0;
    for (Integer k : x.keySet()) {
      E v = values.get(at++);
      if (!domain.isZero(v)) {
        out.put(k, v);
      }
    }
    return out;
  }

  /**
   * Rows in reduced echelon form.
   *
   * @param pivots the pivot columns
   * @param rows each with an integer in its pivot column, where the others have 0
   */
  record Reduced<E>(List<Integer> pivots, List<SortedMap<Integer, E>> rows) {
    Reduced {
      pivots = List.copyOf(pivots);
      rows = List.copyOf(rows);
    }

    private E pivot(int k) {
      return rows.get(k).get(pivots.get(k));
    }

    /** A common multiple of the pivots. */
    E common(Ground<E> ground) {
      E out = ground.domain.one();
      for (int k = 0; k < rows.size(); k++) {
        List<E> q = ground.domain.cofactors(out, pivot(k));
        out = ground.domain.times(out, q.get(1));
      }
      return out;
    }

    /** The quotient of a multiple of a pivot by the pivot. */
    E cofactor(Ground<E> ground, E multiple, int k) {
      List<E> q = ground.domain.cofactors(multiple, pivot(k));
      return ground.domain.times(q.get(0), q.get(1));
    }
  }

  /** A matrix over a common denominator. */
  record Quotient<E>(List<SortedMap<Integer, E>> rows, E denominator) {}
}
