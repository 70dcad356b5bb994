package rankfall.locus;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import rankfall.exact.Chain;
import rankfall.exact.ChainFactoring;
import rankfall.exact.Factoring;
import rankfall.exact.Polynomial;

/**
 * An irreducible set over the space of its free variables.
 *
 * <p>Above an open cell of that space on which no initial and no separant (derivative of a rule by
 * its variable) of the chain has a zero, the points of the set form sheets, as many as above any
 * point of the cell; a polynomial whose norm has no zero there keeps its sign on each sheet.
 *
 * @param chain irreducible
 */
record Chart(Chain chain) {
  static final Comparator<Polynomial> BY_SIZE =
      Comparator.comparing(Polynomial::totalDegree)
          .thenComparing(Polynomial::termCount)
          .thenComparing(Polynomial::toString);

  /** Whether it is a linear space over the free variables, without singular points. */
  boolean isSpace() {
    return chain.tower().size() == ChainFactoring.numbers(chain).size()
        && chain.initials().isEmpty();
  }

  /**
   * The norm of a polynomial over the free variables.
   *
   * @param p does not vanish on the set
   * @return its irreducible factors
   */
  Set<Polynomial> walls(Polynomial p) {
    Set<Polynomial> out = new TreeSet<>(BY_SIZE);
    Polynomial r = chain.reduced(p);
    List<Chain.Rule> tower = chain.tower();
    for (int k = tower.size() - 1; k >= 0 && !r.isConstant(); k--) {
      Chain.Rule rule = tower.get(k);
      if (r.contains(rule.variable())) {
        r = Factoring.squareFreePart(rule.equation().resultant(r, rule.variable()));
      }
    }
    out.addAll(Factoring.irreducible(r));
    return out;
  }

  /** The walls above which sheets meet or run to infinity. */
  Set<Polynomial> ownWalls() {
    Set<Polynomial> out = new TreeSet<>(BY_SIZE);
    chain.initials().forEach(p -> out.addAll(walls(p)));
    separants().forEach(p -> out.addAll(walls(p)));
    return out;
  }

  /** The derivatives of the rules of the tower, numbers excepted, by their variables. */
  List<Polynomial> separants() {
    List<Chain.Rule> numbers = ChainFactoring.numbers(chain);
    List<Polynomial> out = new ArrayList<>();
    for (Chain.Rule r : chain.tower()) {
      if (!numbers.contains(r)) {
        out.add(r.equation().derivative(r.variable()));
      }
    }
    return out;
  }
}
