package rankfall.exact;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.SortedMap;
import java.util.TreeMap;
import org.apache.commons.numbers.fraction.BigFraction;
import rankfall.exact.Chain.Rule;

/**
 * The real points of a chain above a rational point of its free variables.
 *
 * <p>The tower is climbed from the bottom: each rule, at the values below, is split into
 * irreducible factors over the field of these values (Trager 1976), and each real root of a factor
 * is a branch.
 *
 * @param chain what is climbed
 * @param numbers the real roots that are meant by algebraic numbers of the ring, by variable
 */
public record RealFibre(Chain chain, Map<Integer, ConstantRoot> numbers) {
  /** Copies the map. */
  public RealFibre {
    numbers = Map.copyOf(numbers);
  }

  /** A point on its way: values of some variables. */
  private record Branch(
      List<Rule> linear, List<Rule> tower, SortedMap<Integer, AlgebraicNumber> values) {
    Chain chain(Variables ring) {
      List<Rule> all = new ArrayList<>(linear);
      all.addAll(tower);
      return new Chain(ring, all);
    }
  }

  /**
   * The points.
   *
   * @param point a value for each free variable of the chain; other places are not looked at
   * @return those at which no initial vanishes; in ascending order of the tower's coordinates
   */
  public List<RealSample> above(List<BigFraction> point) {
    Variables ring = chain.variables();
    List<Rule> linear = new ArrayList<>();
    for (int v : chain.freeVariables()) {
      Polynomial x = Polynomial.variable(ring, v);
      BigFraction value = point.get(v);
      linear.add(
          new Rule(
              v,
              x.times(Rationals.denominator(value))
                  .minus(Polynomial.constant(ring, Rationals.numerator(value)))));
    }
    List<Branch> open = List.of(new Branch(List.copyOf(linear), List.of(), new TreeMap<>()));
    for (Rule r : chain.tower()) {
      List<Branch> next = new ArrayList<>();
      open.forEach(b -> next.addAll(climbed(b, r)));
      open = next;
    }
    List<RealSample> out = new ArrayList<>();
    open.forEach(b -> out.addAll(solved(b)));
    return List.copyOf(out);
  }

  private List<Branch> climbed(Branch b, Rule r) {
    int x = r.variable();
    Chain here = b.chain(chain.variables());
    Polynomial f = here.reduced(r.equation());
    if (f.degree(x) < r.degree()) {
      return List.of();
    }
    List<Polynomial> factors =
        numbers.containsKey(x) ? List.of(f.primitive()) : ChainFactoring.inVariable(here, f, x);
    SortedMap<AlgebraicNumber, Branch> out = new TreeMap<>();
    for (Polynomial g : factors) {
      Rule rule = new Rule(x, g);
      for (AlgebraicNumber root : TowerPoint.of(here, b.values).roots(rule)) {
        if (isMeant(root, x)) {
          out.put(root, with(b, rule, root));
        }
      }
    }
    return List.copyOf(out.values());
  }

  private static Branch with(Branch b, Rule rule, AlgebraicNumber root) {
    if (rule.isLinear()) {
      List<Rule> linear = new ArrayList<>(b.linear);
      linear.add(rule);
      return new Branch(linear, b.tower, b.values);
    }
    List<Rule> tower = new ArrayList<>(b.tower);
    tower.add(rule);
    SortedMap<Integer, AlgebraicNumber> values = new TreeMap<>(b.values);
    values.put(rule.variable(), root);
    return new Branch(b.linear, tower, values);
  }

  private boolean isMeant(AlgebraicNumber root, int variable) {
    ConstantRoot meant = numbers.get(variable);
    return meant == null || (root.compareTo(meant.low()) >= 0 && root.compareTo(meant.high()) <= 0);
  }

  /** The branch with the variables that the chain gives rationally; none if an initial vanishes. */
  private List<RealSample> solved(Branch b) {
    Chain here = b.chain(chain.variables());
    List<Rule> linear = new ArrayList<>(b.linear);
    for (Rule r : chain.rules()) {
      if (r.isLinear()) {
        Polynomial f = here.reduced(r.equation());
        if (f.degree(r.variable()) < 1) {
          return List.of();
        }
        linear.add(new Rule(r.variable(), f.primitive()));
      }
    }
    Branch all = new Branch(linear, b.tower, b.values);
    return List.of(RealSample.of(all.chain(chain.variables()), b.values));
  }
}
