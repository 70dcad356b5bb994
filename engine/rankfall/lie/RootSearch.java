package rankfall.lie;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.SortedMap;
import java.util.TreeMap;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import rankfall.exact.ChainFactoring;
import rankfall.exact.ChainFractions;
import rankfall.exact.ExtendedChain;
import rankfall.exact.Polynomial;
import rankfall.exact.RationalFunction;

/**
 * The eigenvalues of commuting elements as linear forms, in a ring with one variable an element.
 */
final class RootSearch {
  /** Larger blocks are not asked: their characteristic polynomials are too long. */
  private static final int LARGEST_BLOCK = 12;

  private static final String VALUE = "z#";

  private final CommutingElements elements;
  private final List<String> weights;
  private final ExtendedChain ring;
  private final Polynomial divisor;
  private final List<List<SortedMap<Integer, Polynomial>>> adjoints;

  RootSearch(CommutingElements elements) {
    this.elements = elements;
    this.weights = IntStream.range(0, elements.count()).mapToObj(k -> "y#" + (k + 1)).toList();
    List<String> names = new ArrayList<>(weights);
    names.add(VALUE);
    this.ring = ExtendedChain.of(elements.chain(), names);
    this.divisor = common(elements);
    this.adjoints = elements.adjoints();
  }

  private static Polynomial common(CommutingElements elements) {
    Polynomial out = elements.chain().one();
    for (Polynomial d : elements.divisors()) {
      out = out.times(d.over(out.gcd(d)));
    }
    return out;
  }

  TorusRoots run() {
    List<List<Integer>> blocks = blocks();
    if (blocks.stream().anyMatch(b -> b.size() > LARGEST_BLOCK)) {
      return new TorusRoots.NotTold("the matrices of ad have a common block of more than 12 rows");
    }
    List<Polynomial> characteristic = blocks.stream().map(this::characteristic).toList();
    for (boolean imaginary : List.of(false, true)) {
      SortedMap<String, List<RationalFunction>> found = new TreeMap<>();
      boolean all = true;
      for (Polynomial p : characteristic) {
        Optional<Polynomial> asked = imaginary ? turned(p) : Optional.of(p);
        all = all && asked.isPresent() && addRoots(asked.get(), found);
      }
      if (all) {
        return new TorusRoots.Found(
            imaginary,
            found.values().stream()
                .filter(r -> r.stream().anyMatch(c -> !c.isZero()))
                .sorted(
                    Comparator.comparing(RootSearch::isNegative).thenComparing(RootSearch::text))
                .toList());
      }
    }
    return new TorusRoots.NotTold(
        "the eigenvalues of ad are neither all rational in the parameters nor all i times such");
  }

  private static boolean isNegative(List<RationalFunction> root) {
    return root.stream()
        .filter(c -> !c.isZero())
        .findFirst()
        .map(c -> c.numerator().leadingCoefficient().signum() < 0)
        .orElse(false);
  }

  private static String text(List<RationalFunction> root) {
    return root.stream().map(RationalFunction::toString).collect(Collectors.joining(" "));
  }

  private List<List<Integer>> blocks() {
    return ZeroPattern.blocks(
        elements.ambient(),
        (i, j) ->
            adjoints.stream().anyMatch(a -> a.get(i).containsKey(j) || a.get(j).containsKey(i)));
  }

  /** det(z - divisor * sum y_k ad t_k) on a block. */
  private Polynomial characteristic(List<Integer> block) {
    List<List<Polynomial>> m = new ArrayList<>();
    for (int i : block) {
      List<Polynomial> row = new ArrayList<>();
      for (int j : block) {
        Polynomial sum = ring.chain().zero();
        for (int k = 0; k < adjoints.size(); k++) {
          Polynomial a = adjoints.get(k).get(i).get(j);
          if (a != null) {
            Polynomial times = ring.up(divisor.over(elements.divisors().get(k)));
            sum = sum.plus(ring.up(a).times(times).times(ring.variable(weights.get(k))));
          }
        }
        row.add(sum);
      }
      m.add(row);
    }
    List<Polynomial> c = CharacteristicPolynomial.of(ring.chain(), m);
    Polynomial out = ring.chain().zero();
    for (int k = 0; k < c.size(); k++) {
      out = out.plus(c.get(k).times(ring.variable(VALUE).pow(c.size() - 1 - k)));
    }
    return out;
  }

  /** {@code i^-n p(i z)}, whose roots are those of p over i; empty if it is not real. */
  private Optional<Polynomial> turned(Polynomial p) {
    int z = ring.chain().variables().index(VALUE);
    int n = p.degree(z);
    Polynomial out = ring.chain().zero();
    for (int e = 0; e <= n; e++) {
      Polynomial c = p.coefficient(z, e);
      if ((n - e) % 2 == 1 && !ring.chain().vanishes(c)) {
        return Optional.empty();
      }
      Polynomial term = c.times(ring.variable(VALUE).pow(e));
      out = (n - e) % 4 == 2 ? out.minus(term) : out.plus(term);
    }
    return Optional.of(out);
  }

  /** Adds the roots of a polynomial in z; false if some factor is not linear. */
  private boolean addRoots(Polynomial p, SortedMap<String, List<RationalFunction>> found) {
    int z = ring.chain().variables().index(VALUE);
    for (Polynomial f : ChainFactoring.inVariable(ring.chain(), p, z)) {
      if (f.degree(z) > 1) {
        return false;
      }
      RationalFunction value =
          ChainFractions.canonical(ring.chain(), f.coefficient(z, 0).negate(), f.coefficient(z, 1));
      List<RationalFunction> root = new ArrayList<>();
      Polynomial rest = value.numerator();
      for (String name : weights) {
        Polynomial y = ring.variable(name);
        Polynomial c = value.numerator().coefficient(ring.chain().variables().index(name), 1);
        rest = rest.minus(c.times(y));
        if (weights.stream().anyMatch(w -> c.contains(ring.chain().variables().index(w)))) {
          return false;
        }
        root.add(elements.canonical(ring.down(c), ring.down(value.denominator()).times(divisor)));
      }
      if (!rest.isZero()) {
        return false;
      }
      found.put(text(root), root);
    }
    return true;
  }
}
