package rankfall.lie;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.apache.commons.numbers.fraction.BigFraction;
import rankfall.exact.Chain;
import rankfall.exact.ChainFractions;
import rankfall.exact.RationalFunction;

/**
 * Simple roots of a root system with their lengths (Humphreys, Introduction to Lie Algebras and
 * Representation Theory, sec. 10 and 11; places from memory).
 *
 * @param simple by their values on the elements of the torus, in the order of the types
 * @param squaredLengths of the simple roots
 * @param positive the positive roots as sums of simple ones, by height
 * @param cartan the Cartan matrix
 * @param parts its irreducible parts; {@code order} counts in {@code simple}
 */
public record SimpleRoots(
    List<List<RationalFunction>> simple,
    List<RationalFunction> squaredLengths,
    List<List<Integer>> positive,
    CartanMatrix cartan,
    List<CartanMatrix.Part> parts) {
  /** Copies the lists. */
  public SimpleRoots {
    simple = simple.stream().map(List::copyOf).toList();
    squaredLengths = List.copyOf(squaredLengths);
    positive = positive.stream().map(List::copyOf).toList();
    parts = List.copyOf(parts);
  }

  /**
   * The simple roots of a set of roots.
   *
   * <p>Each root is written in the first independent ones; positive is whose first coefficient that
   * is not 0 is positive, simple what is no sum of two positive roots.
   *
   * @param dual the form on the dual of the torus
   * @param roots by their values on the elements of the torus
   * @return empty if the roots are no root system of full rank
   */
  public static Optional<SimpleRoots> of(RestrictedForm dual, List<List<RationalFunction>> roots) {
    return new Search(dual, roots).run();
  }

  private record Search(RestrictedForm dual, List<List<RationalFunction>> roots) {
    private RationalFunction product(List<RationalFunction> a, List<RationalFunction> b) {
      return RestrictedForm.value(dual.chain(), dual.matrix(), a, b);
    }

    private Optional<SimpleRoots> run() {
      List<List<RationalFunction>> first = new ArrayList<>();
      Optional<RestrictedForm> inverse = Optional.empty();
      for (List<RationalFunction> r : roots) {
        List<List<RationalFunction>> more = new ArrayList<>(first);
        more.add(r);
        Optional<RestrictedForm> next = RestrictedForm.of(dual.chain(), dual.matrix(), more).dual();
        if (next.isPresent() && more.size() <= dual.matrix().size()) {
          first = more;
          inverse = next;
        }
      }
      if (inverse.isEmpty() || first.size() < dual.matrix().size()) {
        return Optional.empty();
      }
      Map<List<BigFraction>, List<RationalFunction>> positive = new HashMap<>();
      for (List<RationalFunction> r : roots) {
        Optional<List<BigFraction>> c = coordinates(first, inverse.get(), r);
        if (c.isEmpty()) {
          return Optional.empty();
        }
        if (isPositive(c.get())) {
          positive.put(c.get(), r);
        }
      }
      return 2 * positive.size() == roots.size() ? among(positive) : Optional.empty();
    }

    private Optional<List<BigFraction>> coordinates(
        List<List<RationalFunction>> first, RestrictedForm inverse, List<RationalFunction> root) {
      Chain chain = dual.chain();
      List<BigFraction> out = new ArrayList<>();
      for (int k = 0; k < first.size(); k++) {
        RationalFunction sum = RationalFunction.of(chain.zero());
        for (int l = 0; l < first.size(); l++) {
          sum = sum.plus(inverse.matrix().get(k).get(l).times(product(first.get(l), root)));
        }
        RationalFunction c = ChainFractions.canonical(chain, sum);
        if (!c.isConstant()) {
          return Optional.empty();
        }
        out.add(c.constantValue());
      }
      return Optional.of(out);
    }

    private static boolean isPositive(List<BigFraction> c) {
      return c.stream()
          .filter(x -> x.signum() != 0)
          .findFirst()
          .map(x -> x.signum() > 0)
          .orElse(false);
    }

    private Optional<SimpleRoots> among(Map<List<BigFraction>, List<RationalFunction>> positive) {
      List<List<BigFraction>> all = new ArrayList<>(positive.keySet());
      List<List<BigFraction>> simple =
          all.stream()
              .filter(s -> all.stream().noneMatch(a -> positive.containsKey(sum(s, a, -1))))
              .sorted(Comparator.comparing(c -> positive.get(c).toString()))
              .toList();
      if (simple.size() != dual.matrix().size()) {
        return Optional.empty();
      }
      List<List<RationalFunction>> values = simple.stream().map(positive::get).toList();
      Optional<CartanMatrix> cartan = cartan(values);
      Optional<List<CartanMatrix.Part>> parts = cartan.flatMap(CartanMatrix::parts);
      if (parts.isEmpty()) {
        return Optional.empty();
      }
      List<CartanMatrix.Part> byType = new ArrayList<>(parts.get());
      byType.sort(
          Comparator.comparing(CartanMatrix.Part::toString)
              .thenComparing(p -> values.get(p.order().get(0)).toString()));
      List<Integer> order = byType.stream().flatMap(p -> p.order().stream()).toList();
      List<List<RationalFunction>> ordered = order.stream().map(values::get).toList();
      Optional<List<List<Integer>>> sums =
          sums(order.stream().map(simple::get).toList(), positive.keySet().stream().toList());
      return sums.map(
          s ->
              new SimpleRoots(
                  ordered,
                  ordered.stream().map(r -> product(r, r)).toList(),
                  s,
                  cartan.get().in(order),
                  numbered(byType)));
    }

    /** Lower ones first, then those that hold more of the first simple roots. */
    private static int byHeight(List<Integer> a, List<Integer> b) {
      int c = Integer.compare(height(a), height(b));
      for (int k = 0; c == 0 && k < a.size(); k++) {
        c = Integer.compare(b.get(k), a.get(k));
      }
      return c;
    }

    private static int height(List<Integer> sum) {
      return sum.stream().mapToInt(Integer::intValue).sum();
    }

    private static List<CartanMatrix.Part> numbered(List<CartanMatrix.Part> parts) {
      List<CartanMatrix.Part> out = new ArrayList<>();
      int at = 0;
      for (CartanMatrix.Part p : parts) {
        List<Integer> order = new ArrayList<>();
        for (int k = 0; k < p.order().size(); k++) {
          order.add(at++);
        }
        out.add(new CartanMatrix.Part(p.letter(), order));
      }
      return out;
    }

    private static List<BigFraction> sum(List<BigFraction> a, List<BigFraction> b, int factor) {
      List<BigFraction> out = new ArrayList<>();
      for (int k = 0; k < a.size(); k++) {
        out.add(a.get(k).add(b.get(k).multiply(factor)));
      }
      return out;
    }

    private Optional<CartanMatrix> cartan(List<List<RationalFunction>> simple) {
      List<List<Integer>> rows = new ArrayList<>();
      for (List<RationalFunction> a : simple) {
        List<Integer> row = new ArrayList<>();
        for (List<RationalFunction> b : simple) {
          RationalFunction c =
              ChainFractions.canonical(
                  dual.chain(), product(a, b).plus(product(a, b)).over(product(b, b)));
          if (!c.isConstant() || !c.denominator().isOne()) {
            return Optional.empty();
          }
          row.add(c.numerator().constantValue().intValueExact());
        }
        rows.add(row);
      }
      return Optional.of(new CartanMatrix(rows));
    }

    /** Every positive root is a simple one, or a simple one more than another positive root. */
    private static Optional<List<List<Integer>>> sums(
        List<List<BigFraction>> simple, List<List<BigFraction>> positive) {
      Map<List<BigFraction>, List<Integer>> found = new HashMap<>();
      List<List<BigFraction>> level = new ArrayList<>();
      for (int k = 0; k < simple.size(); k++) {
        List<Integer> one = new ArrayList<>(java.util.Collections.nCopies(simple.size(), 0));
        one.set(k, 1);
        found.put(simple.get(k), one);
        level.add(simple.get(k));
      }
      List<List<Integer>> out = new ArrayList<>(found.values());
      while (!level.isEmpty()) {
        List<List<BigFraction>> next = new ArrayList<>();
        for (List<BigFraction> r : level) {
          for (int k = 0; k < simple.size(); k++) {
            List<BigFraction> s = sum(r, simple.get(k), 1);
            if (positive.contains(s) && !found.containsKey(s)) {
              List<Integer> more = new ArrayList<>(found.get(r));
              more.set(k, more.get(k) + 1);
              found.put(s, more);
              out.add(more);
              next.add(s);
            }
          }
        }
        level = next;
      }
      out.sort(Search::byHeight);
      return out.size() == positive.size() ? Optional.of(out) : Optional.empty();
    }
  }

  /** The type, such as {@code A2} or {@code A1 + A1}. */
  public String type() {
    return parts.stream()
        .map(CartanMatrix.Part::toString)
        .collect(java.util.stream.Collectors.joining(" + "));
  }
}
