package rankfall.locus;

import java.util.List;
import rankfall.exact.Domain;
import rankfall.exact.Polynomial;

/**
 * A ring of polynomials whose products are counted.
 *
 * @param ring does the work
 * @param tally counts it
 */
record Counted(Domain<Polynomial> ring, Tally tally) implements Domain<Polynomial> {
  /** What a common factor costs, in products a term. */
  private static final int FACTOR = 8;

  @Override
  public Polynomial zero() {
    return ring.zero();
  }

  @Override
  public Polynomial one() {
    return ring.one();
  }

  @Override
  public Polynomial plus(Polynomial a, Polynomial b) {
    return ring.plus(a, b);
  }

  @Override
  public Polynomial times(Polynomial a, Polynomial b) {
    tally.add((long) a.termCount() * b.termCount());
    return ring.times(a, b);
  }

  @Override
  public Polynomial negate(Polynomial a) {
    return ring.negate(a);
  }

  @Override
  public boolean isZero(Polynomial a) {
    return ring.isZero(a);
  }

  @Override
  public Normal<Polynomial> normal(List<Polynomial> row) {
    long terms = row.stream().mapToLong(Polynomial::termCount).sum();
    tally.add(FACTOR * terms);
    return ring.normal(row);
  }

  @Override
  public List<Polynomial> cofactors(Polynomial a, Polynomial b) {
    tally.add(FACTOR * (long) (a.termCount() + b.termCount()));
    return ring.cofactors(a, b);
  }

  @Override
  public int weight(Polynomial a) {
    return ring.weight(a);
  }
}
