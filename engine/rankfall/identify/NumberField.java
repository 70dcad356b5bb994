package rankfall.identify;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import rankfall.exact.Chain;
import rankfall.exact.ChainFractions;
import rankfall.exact.Domain;
import rankfall.exact.Polynomial;

/**
 * The field of a chain of dimension 0 for row reduction. A row in normal form has an integer as its
 * first entry that is not 0, so that numbers stay as short as the row allows; greatest common
 * divisors of polynomials alone would let their length double at each step.
 *
 * @param chain no free variable occurs in the elements
 */
record NumberField(Chain chain) implements Domain<Polynomial> {
  @Override
  public Polynomial zero() {
    return chain.zero();
  }

  @Override
  public Polynomial one() {
    return chain.one();
  }

  @Override
  public Polynomial plus(Polynomial a, Polynomial b) {
    return a.plus(b);
  }

  @Override
  public Polynomial times(Polynomial a, Polynomial b) {
    return a.times(b);
  }

  @Override
  public Polynomial negate(Polynomial a) {
    return a.negate();
  }

  @Override
  public boolean isZero(Polynomial a) {
    return a.isZero();
  }

  @Override
  public Normal<Polynomial> normal(List<Polynomial> row) {
    List<Polynomial> entries = chain.reduced(row);
    return new Normal<>(
        entries.stream()
            .filter(p -> !p.isZero())
            .findFirst()
            .map(lead -> primitive(freed(entries, lead)))
            .orElse(entries),
        one());
  }

  /** A multiple of the row in which one of its entries, not 0, has become an integer. */
  private List<Polynomial> freed(List<Polynomial> row, Polynomial entry) {
    if (entry.isConstant()) {
      return row;
    }
    Polynomial inverse = ChainFractions.canonical(chain, one(), entry).numerator();
    return chain.reduced(row.stream().map(p -> p.times(inverse)).toList());
  }

  /** Free of a common integer factor. */
  List<Polynomial> primitive(List<Polynomial> row) {
    BigInteger content = BigInteger.ZERO;
    for (Polynomial p : row) {
      content = content.gcd(p.content());
    }
    if (content.equals(BigInteger.ONE)) {
      return row;
    }
    Polynomial divisor = Polynomial.constant(chain.variables(), content);
    List<Polynomial> out = new ArrayList<>();
    row.forEach(p -> out.add(p.over(divisor)));
    return out;
  }

  @Override
  public List<Polynomial> cofactors(Polynomial a, Polynomial b) {
    return primitive(freed(List.of(a, b), a));
  }

  @Override
  public int weight(Polynomial a) {
    return chain.weight(a);
  }
}
