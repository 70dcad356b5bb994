package rankfall.exact;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import org.apache.commons.numbers.fraction.BigFraction;
import rankfall.exact.Factorization.Factor;

/** Irreducible factors over the field of a chain. */
public final class ChainFactoring {
  private static final int SHIFTS = 40;
  private static final Comparator<Polynomial> BY_SIZE =
      Comparator.comparing(Polynomial::totalDegree)
          .thenComparing(Polynomial::termCount)
          .thenComparing(Polynomial::toString);

  private ChainFactoring() {}

  /**
   * The rules at the bottom of a chain's tower that define algebraic numbers: those without a free
   * variable.
   *
   * @param chain any chain
   * @return a tower over the rationals, from the bottom
   */
  public static List<Chain.Rule> numbers(Chain chain) {
    Set<Integer> known = new HashSet<>();
    List<Chain.Rule> out = new ArrayList<>();
    for (Chain.Rule r : chain.tower()) {
      Set<Integer> support = new HashSet<>(r.equation().support());
      support.remove(r.variable());
      if (known.containsAll(support)) {
        out.add(r);
        known.add(r.variable());
      }
    }
    return out;
  }

  /**
   * The different irreducible factors of a polynomial over the algebraic numbers of a chain.
   *
   * @param chain only its rules for algebraic numbers are used
   * @param f a polynomial that is not 0 over these numbers
   * @return factors that hold a variable other than those numbers; sorted by size, then text
   */
  public static List<Polynomial> irreducible(Chain chain, Polynomial f) {
    List<Chain.Rule> numbers = numbers(chain);
    return numbers.isEmpty()
        ? Factoring.irreducible(f)
        : factors(chain, numbers, f).stream().map(Factor::base).toList();
  }

  private static List<Factor> factors(Chain chain, List<Chain.Rule> numbers, Polynomial f) {
    Polynomial g = new Chain(chain.variables(), numbers).reduced(f);
    if (g.isZero()) {
      throw new ArithmeticException("0 has no factorization");
    }
    List<Factor> out =
        new ArrayList<>(new NumberFieldFactoring(chain.variables(), numbers).factors(g));
    out.sort(Comparator.comparing(Factor::base, BY_SIZE));
    return out;
  }

  /**
   * The factorization over the algebraic numbers of a chain.
   *
   * @param chain only its rules for algebraic numbers are used
   * @param f a polynomial that is not 0 over these numbers, in normal form unless all rules are
   *     monic
   * @return its bases have a rational leading coefficient; an algebraic number that is left over
   *     stands among the factors as one more base
   */
  public static Factorization factorization(Chain chain, Polynomial f) {
    List<Chain.Rule> numbers = numbers(chain);
    if (numbers.isEmpty()) {
      return Factoring.overRationals(f);
    }
    Polynomial g = new Chain(chain.variables(), numbers).reduced(f);
    if (!g.equals(f) && !isMonic(numbers)) {
      throw new ArithmeticException("not in normal form: " + f);
    }
    List<Factor> out = factors(chain, numbers, g);
    BigFraction unit = BigFraction.ONE;
    for (Factor x : out) {
      unit = unit.divide(BigFraction.of(x.base().leadingCoefficient()).pow(x.multiplicity()));
    }
    Polynomial leading = leading(g);
    BigInteger size = leading.content();
    BigInteger content = leading.leadingCoefficient().signum() < 0 ? size.negate() : size;
    Polynomial number = leading.over(Polynomial.constant(g.variables(), content));
    unit = unit.multiply(content);
    if (number.isConstant()) {
      unit = unit.multiply(number.constantValue());
    } else {
      out.add(0, new Factor(number, 1));
    }
    return new Factorization(unit, out);
  }

  private static boolean isMonic(List<Chain.Rule> rules) {
    return rules.stream().allMatch(r -> r.initial().isOne());
  }

  /** The coefficient, an algebraic number, of the leading monomial in the other variables. */
  private static Polynomial leading(Polynomial g) {
    int own = g.variables().indeterminates();
    List<Term> terms = new ArrayList<>(g.terms());
    terms.sort(PolynomialText.order(g.variables()));
    List<Integer> top = terms.get(0).exponents().subList(0, own);
    List<Term> out = new ArrayList<>();
    for (Term t : terms) {
      if (t.exponents().subList(0, own).equals(top)) {
        List<Integer> e = new ArrayList<>(t.exponents());
        for (int v = 0; v < own; v++) {
          e.set(v, 0);
        }
        out.add(new Term(t.coefficient(), e));
      }
    }
    return Polynomial.of(g.variables(), out);
  }

  /**
   * The different irreducible factors of a polynomial in one variable over the field of a chain.
   *
   * <p>The tower is brought down by norms, which are resultants (Trager, Algebraic factoring and
   * rational function integration, SYMSAC 1976).
   *
   * @param chain an irreducible chain in which x is free; the other free variables count as
   *     elements of the field
   * @param f does not vanish on the chain
   * @return those factors that hold x
   */
  public static List<Polynomial> inVariable(Chain chain, Polynomial f, int x) {
    Polynomial g = chain.reduced(f);
    if (!g.contains(x)) {
      return List.of();
    }
    if (chain.tower().size() == numbers(chain).size()) {
      return irreducible(chain, g).stream().filter(p -> p.contains(x)).toList();
    }
    List<Polynomial> out = new ArrayList<>();
    for (Polynomial h : irreducible(chain, g)) {
      if (h.contains(x)) {
        out.addAll(split(chain, squareFree(chain, h, x), x));
      }
    }
    out.sort(BY_SIZE);
    return out;
  }

  private static Polynomial squareFree(Chain chain, Polynomial h, int x) {
    Polynomial g = ChainGcd.of(chain, h, h.derivative(x), x);
    if (!g.contains(x)) {
      return h;
    }
    return ChainGcd.quotient(chain, h, g, x);
  }

  private static List<Polynomial> split(Chain chain, Polynomial h, int x) {
    if (h.degree(x) == 1) {
      return List.of(h);
    }
    for (int shift = 0; shift < SHIFTS; shift++) {
      Polynomial there = shifted(chain, x, -shift);
      Polynomial norm = norm(chain, chain.reduced(h.substitute(x, there)), x);
      if (norm.contains(x) && isSquareFreeIn(norm, x)) {
        return parts(chain, h, x, Factoring.irreducible(norm), shifted(chain, x, shift));
      }
    }
    throw new ArithmeticException("no square-free norm found of " + h);
  }

  /** x plus a combination of the tower's variables. */
  private static Polynomial shifted(Chain chain, int x, int by) {
    Polynomial sum = Polynomial.variable(chain.variables(), x);
    int k = 1;
    for (Chain.Rule r : chain.tower()) {
      Polynomial alpha = Polynomial.variable(chain.variables(), r.variable());
      sum = sum.plus(alpha.times(BigInteger.valueOf((long) by * k++)));
    }
    return sum;
  }

  private static boolean isSquareFreeIn(Polynomial norm, int x) {
    return !norm.gcd(norm.derivative(x)).contains(x);
  }

  private static Polynomial norm(Chain chain, Polynomial f, int x) {
    List<Chain.Rule> tower = chain.tower();
    Polynomial n = f;
    for (int k = tower.size() - 1; k >= 0; k--) {
      Chain.Rule r = tower.get(k);
      n =
          n.contains(r.variable())
              ? chain.reduced(r.equation().resultant(n, r.variable())).primitive()
              : n.pow(r.degree());
    }
    return n.contains(x) ? n : chain.one();
  }

  private static List<Polynomial> parts(
      Chain chain, Polynomial h, int x, List<Polynomial> normFactors, Polynomial back) {
    List<Polynomial> own = normFactors.stream().filter(n -> n.contains(x)).toList();
    if (own.size() == 1) {
      return List.of(h);
    }
    List<Polynomial> out = new ArrayList<>();
    for (Polynomial n : own) {
      Polynomial g = ChainGcd.of(chain, h, chain.reduced(n.substitute(x, back)), x);
      if (g.contains(x)) {
        out.add(g);
      }
    }
    return out;
  }
}
