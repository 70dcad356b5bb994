package rankfall.locus;

import java.util.ArrayList;
import java.util.List;
import rankfall.exact.Chain;
import rankfall.exact.Domain;
import rankfall.exact.Polynomial;

/**
 * The ring on a piece, where some polynomials are known not to vanish: these make pivots as good as
 * constants.
 *
 * @param chain the chain of the piece
 * @param nonZero reduced on the chain, irreducible
 */
public record KnownNonZero(Chain chain, List<Polynomial> nonZero) implements Domain<Polynomial> {
  /** Copies the list. */
  public KnownNonZero {
    nonZero = List.copyOf(nonZero);
  }

  /** The ring on a piece. */
  public static KnownNonZero on(Piece piece) {
    List<Polynomial> known = new ArrayList<>();
    for (Polynomial p : piece.nonZero()) {
      Polynomial r = piece.chain().reduced(p);
      if (!r.isConstant()) {
        known.add(r.primitive());
      }
    }
    return new KnownNonZero(piece.chain(), known);
  }

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
    return chain.normal(row, nonZero);
  }

  @Override
  public List<Polynomial> cofactors(Polynomial a, Polynomial b) {
    return chain.cofactors(a, b);
  }

  /** The weight of what is left when the factors that cannot vanish are taken out. */
  @Override
  public int weight(Polynomial a) {
    if (a.isConstant()) {
      return 0;
    }
    if (a.termCount() == 1) {
      return a.support().stream().filter(v -> !isKnown(v)).mapToInt(a::degree).sum();
    }
    Polynomial rest = a;
    for (Polynomial p : nonZero) {
      if (rest.isConstant()) {
        return 0;
      }
      if (p.totalDegree() <= rest.totalDegree() && p.support().stream().allMatch(rest::contains)) {
        for (var q = rest.dividedBy(p); q.isPresent() && !rest.isConstant(); ) {
          rest = q.get();
          q = rest.dividedBy(p);
        }
      }
    }
    return chain.weight(rest);
  }

  private boolean isKnown(int variable) {
    return nonZero.stream()
        .anyMatch(p -> p.termCount() == 1 && p.totalDegree() == 1 && p.contains(variable));
  }
}
