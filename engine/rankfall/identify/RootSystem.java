package rankfall.identify;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.IntStream;
import org.apache.commons.numbers.fraction.BigFraction;

/**
 * A root system with a base (Humphreys, Introduction to Lie Algebras, sections 9.2 and 10.1).
 *
 * @param roots all roots, as values on a basis of the Cartan subalgebra
 * @param simple those of the base, in an order in which the Cartan matrix is that of the type
 * @param cartanMatrix {@code <alpha_i, alpha_j>} of the base
 * @param types of the irreducible components, in the order of the base
 */
public record RootSystem(
    List<List<BigFraction>> roots,
    List<List<BigFraction>> simple,
    List<List<Integer>> cartanMatrix,
    List<SimpleType> types) {
  /** Copies the lists. */
  public RootSystem {
    roots = roots.stream().map(List::copyOf).toList();
    simple = simple.stream().map(List::copyOf).toList();
    cartanMatrix = cartanMatrix.stream().map(List::copyOf).toList();
    types = List.copyOf(types);
  }

  /**
   * The system that some vectors are.
   *
   * @param roots not 0, different; values on a basis of the Cartan subalgebra, which they span
   * @param form the positive definite form on the dual of the Cartan subalgebra, in the dual basis
   * @return the system
   * @throws IllegalArgumentException if an axiom fails: a Cartan number that is no integer, a
   *     reflection that leads out, a multiple of a root other than its negative
   */
  public static RootSystem of(List<List<BigFraction>> roots, List<List<BigFraction>> form) {
    check(roots, form);
    List<List<BigFraction>> positive =
        roots.stream().filter(RootSystem::isPositive).sorted(LEXICOGRAPHIC).toList();
    Set<List<BigFraction>> sums = new HashSet<>();
    for (List<BigFraction> a : positive) {
      positive.forEach(b -> sums.add(plus(a, b, 1)));
    }
    List<List<BigFraction>> base = positive.stream().filter(a -> !sums.contains(a)).toList();
    List<List<BigFraction>> ordered = new ArrayList<>();
    List<SimpleType> types = new ArrayList<>();
    for (List<Integer> component : components(base, form)) {
      Arrangement found =
          arrangement(component.stream().map(base::get).toList(), form)
              .orElseThrow(() -> new IllegalArgumentException("no type has this base"));
      ordered.addAll(found.simple);
      types.add(found.type);
    }
    return new RootSystem(roots, ordered, cartanMatrix(ordered, form), types);
  }

  private static final Comparator<List<BigFraction>> LEXICOGRAPHIC =
      (a, b) -> firstSign(plus(a, b, -1));

  private static int firstSign(List<BigFraction> a) {
    return a.stream().mapToInt(BigFraction::signum).filter(s -> s != 0).findFirst().orElse(0);
  }

  private static boolean isPositive(List<BigFraction> a) {
    return firstSign(a) > 0;
  }

  private static List<BigFraction> plus(List<BigFraction> a, List<BigFraction> b, int factor) {
    return IntStream.range(0, a.size())
        .mapToObj(i -> a.get(i).add(b.get(i).multiply(factor)))
        .toList();
  }

  private static BigFraction product(
      List<BigFraction> a, List<BigFraction> b, List<List<BigFraction>> form) {
    BigFraction sum = BigFraction.ZERO;
    for (int i = 0; i < a.size(); i++) {
      for (int j = 0; j < b.size(); j++) {
        sum = sum.add(a.get(i).multiply(form.get(i).get(j)).multiply(b.get(j)));
      }
    }
    return sum;
  }

  /**
   * The Cartan number {@code <a, b> = 2(a,b)/(b,b)}.
   *
   * @throws IllegalArgumentException if it is no integer
   */
  private static int number(
      List<BigFraction> a, List<BigFraction> b, List<List<BigFraction>> form) {
    BigFraction q = product(a, b, form).multiply(2).divide(product(b, b, form));
    if (q.getNumerator().mod(q.getDenominator().abs()).signum() != 0) {
      throw new IllegalArgumentException("the Cartan number " + q + " is no integer");
    }
    return q.intValue();
  }

  private static void check(List<List<BigFraction>> roots, List<List<BigFraction>> form) {
    Set<List<BigFraction>> all = new HashSet<>(roots);
    for (List<BigFraction> b : roots) {
      if (firstSign(b) == 0 || product(b, b, form).signum() <= 0) {
        throw new IllegalArgumentException("a root has no positive length: " + b);
      }
      if (all.contains(plus(b, b, 1))) {
        throw new IllegalArgumentException("a root is twice another: " + b);
      }
      for (List<BigFraction> a : roots) {
        if (!all.contains(plus(a, b, -number(a, b, form)))) {
          throw new IllegalArgumentException("a reflection of " + a + " is no root");
        }
      }
    }
  }

  private static List<List<Integer>> cartanMatrix(
      List<List<BigFraction>> base, List<List<BigFraction>> form) {
    return base.stream().map(a -> base.stream().map(b -> number(a, b, form)).toList()).toList();
  }

  /** Positions of the members of each connected component of the Dynkin diagram. */
  private static List<List<Integer>> components(
      List<List<BigFraction>> base, List<List<BigFraction>> form) {
    List<List<Integer>> out = new ArrayList<>();
    Set<Integer> open = new TreeSet<>(IntStream.range(0, base.size()).boxed().toList());
    while (!open.isEmpty()) {
      List<Integer> component = new ArrayList<>(List.of(open.iterator().next()));
      for (int k = 0; k < component.size(); k++) {
        List<BigFraction> a = base.get(component.get(k));
        for (int j = 0; j < base.size(); j++) {
          if (!component.contains(j) && product(a, base.get(j), form).signum() != 0) {
            component.add(j);
          }
        }
      }
      component.forEach(open::remove);
      out.add(component);
    }
    return out;
  }

  /** A base in the order of its type. */
  private record Arrangement(List<List<BigFraction>> simple, SimpleType type) {}

  private static Optional<Arrangement> arrangement(
      List<List<BigFraction>> base, List<List<BigFraction>> form) {
    List<List<Integer>> given = cartanMatrix(base, form);
    for (SimpleType.Series s : SimpleType.Series.values()) {
      Optional<SimpleType> type = SimpleType.ofRank(s, base.size());
      if (type.isPresent()) {
        List<Integer> order = new ArrayList<>();
        if (match(given, type.get().cartanMatrix(), order)) {
          return Optional.of(new Arrangement(order.stream().map(base::get).toList(), type.get()));
        }
      }
    }
    return Optional.empty();
  }

  /** Extends an order of the given matrix to one in which it is the wanted one, by trial. */
  private static boolean match(
      List<List<Integer>> given, List<List<Integer>> wanted, List<Integer> order) {
    int k = order.size();
    if (k == given.size()) {
      return true;
    }
    for (int next = 0; next < given.size(); next++) {
      int node = next;
      boolean fits =
          !order.contains(node)
              && IntStream.range(0, k)
                  .allMatch(
                      j ->
                          given.get(order.get(j)).get(node).equals(wanted.get(j).get(k))
                              && given.get(node).get(order.get(j)).equals(wanted.get(k).get(j)));
      if (fits) {
        order.add(node);
        if (match(given, wanted, order)) {
          return true;
        }
        order.remove(order.size() - 1);
      }
    }
    return false;
  }
}
