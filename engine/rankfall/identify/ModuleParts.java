package rankfall.identify;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Optional;
import java.util.SortedMap;
import java.util.TreeMap;
import java.util.stream.IntStream;
import org.apache.commons.numbers.fraction.BigFraction;
import rankfall.exact.Elimination;
import rankfall.exact.Rationals;

/**
 * The parts of a module of a semisimple algebra on which the Casimir elements of its ideals have
 * one value each.
 *
 * <p>The Casimir element of an ideal acts on an irreducible module as a rational number (Humphreys,
 * Introduction to Lie Algebras, section 6.2), which all modules up to the dimension at hand are
 * tried for. The dimensions of the joint eigenspaces add up to that of the module, or nothing is
 * said.
 *
 * @param parts of positive dimension
 */
record ModuleParts(List<Isotypic> parts) {
  ModuleParts {
    parts = List.copyOf(parts);
  }

  /**
   * A joint eigenspace. Over the complex numbers it is a sum of modules, each a tensor product of
   * one module for each simple ideal.
   *
   * @param labels for each ideal of the field the possible highest weights, one a simple ideal over
   *     the complex numbers; in all of them the Casimir element has the same value
   * @param dimension of the eigenspace
   */
  record Isotypic(List<List<List<List<Integer>>>> labels, int dimension) {
    Isotypic {
      labels = labels.stream().map(List::copyOf).toList();
    }

    /** Whether an ideal does not act as 0. */
    boolean moves(int ideal) {
      return labels.get(ideal).stream()
          .anyMatch(tuple -> tuple.stream().anyMatch(w -> w.stream().anyMatch(c -> c != 0)));
    }

    private Isotypic only(List<Integer> ideals) {
      return new Isotypic(ideals.stream().map(labels::get).toList(), dimension);
    }
  }

  /**
   * Some of the ideals and the parts on which they act, no other ideal acting there.
   *
   * @param ideals positions
   * @param module its labels are those of the ideals only
   */
  record Summand(List<Integer> ideals, ModuleParts module) {}

  /** The finest decomposition of algebra and module, each ideal and each part in one summand. */
  List<Summand> summands() {
    int count = parts.isEmpty() ? 0 : parts.get(0).labels.size();
    List<Summand> out = new ArrayList<>();
    List<Integer> open = new ArrayList<>(IntStream.range(0, count).boxed().toList());
    while (!open.isEmpty()) {
      List<Integer> some = new ArrayList<>(List.of(open.get(0)));
      List<Isotypic> own = new ArrayList<>();
      for (int k = 0; k < some.size(); k++) {
        for (Isotypic part : parts) {
          if (part.moves(some.get(k)) && !own.contains(part)) {
            own.add(part);
            open.stream().filter(i -> part.moves(i) && !some.contains(i)).forEach(some::add);
          }
        }
      }
      Collections.sort(some);
      open.removeAll(some);
      out.add(new Summand(some, new ModuleParts(own.stream().map(p -> p.only(some)).toList())));
    }
    return out;
  }

  /** A value of a Casimir element with the weights that have it. */
  private record Value(BigFraction casimir, List<List<List<Integer>>> weights) {}

  /**
   * Splits a module.
   *
   * @param ground the field
   * @param killing the Killing matrix of the semisimple algebra in a multiple of its basis
   * @param scale that multiple
   * @param ideals its ideals over the field
   * @param module what its basis elements do
   * @return empty if a type is unknown
   */
  static <E> Optional<ModuleParts> of(
      Ground<E> ground,
      List<List<E>> killing,
      E scale,
      List<SimpleIdeals.Part<E>> ideals,
      Action<E> module) {
    int dimension = module.dimension();
    List<Space<E>> spaces = new ArrayList<>();
    spaces.add(new Space<>(List.of(), module.everything(ground)));
    for (SimpleIdeals.Part<E> ideal : ideals) {
      if (ideal.ideals().get(0).type().isEmpty()) {
        return Optional.empty();
      }
      List<SortedMap<Integer, E>> casimir = module.casimir(ground, killing, scale, ideal.basis());
      List<Space<E>> next = new ArrayList<>();
      for (Space<E> s : spaces) {
        for (Value v : values(ideal, dimension)) {
          List<SortedMap<Integer, E>> basis = eigenspace(ground, casimir, v.casimir, s.basis);
          if (!basis.isEmpty()) {
            List<List<List<List<Integer>>>> labels = new ArrayList<>(s.labels);
            labels.add(v.weights);
            next.add(new Space<>(labels, basis));
          }
        }
      }
      spaces = next;
    }
    if (spaces.stream().mapToInt(s -> s.basis.size()).sum() != dimension) {
      throw new IllegalStateException("eigenspaces of Casimir elements do not fill the module");
    }
    return Optional.of(
        new ModuleParts(spaces.stream().map(s -> new Isotypic(s.labels, s.basis.size())).toList()));
  }

  /** A joint eigenspace of some of the ideals. */
  private record Space<E>(
      List<List<List<List<Integer>>>> labels, List<SortedMap<Integer, E>> basis) {}

  /** The vectors of a space on which the matrix, a multiple of the Casimir, has the value. */
  private static <E> List<SortedMap<Integer, E>> eigenspace(
      Ground<E> ground,
      List<SortedMap<Integer, E>> casimir,
      BigFraction value,
      List<SortedMap<Integer, E>> space) {
    int n = casimir.size() - 1;
    E unit = casimir.get(n).get(0);
    E below = ground.integer(Rationals.denominator(value));
    E above =
        ground
            .domain()
            .negate(ground.domain().times(ground.integer(Rationals.numerator(value)), unit));
    List<SortedMap<Integer, E>> columns = new ArrayList<>();
    for (SortedMap<Integer, E> x : space) {
      SortedMap<Integer, E> image = new TreeMap<>();
      ground.add(image, below, Action.times(ground, casimir.subList(0, n), x));
      ground.add(image, above, x);
      columns.add(image);
    }
    List<SortedMap<Integer, E>> weights =
        Elimination.of(ground.domain(), Action.transposed(columns, n), space.size()).kernel();
    List<SortedMap<Integer, E>> combined =
        weights.stream().map(w -> ground.combination(w, space)).toList();
    return ground.reduced(combined, n, n).rows();
  }

  /** The values of the Casimir element of an ideal on modules up to a dimension. */
  private static <E> List<Value> values(SimpleIdeals.Part<E> ideal, int most) {
    SimpleIdeal first = ideal.ideals().get(0);
    Weights weights = Weights.of(first.type().orElseThrow());
    int count = ideal.basis().size() / weights.type().dimension();
    SortedMap<BigFraction, List<List<List<Integer>>>> byValue =
        new TreeMap<>((a, b) -> Rationals.compare(a, b));
    for (List<List<Integer>> tuple : tuples(weights, weights.upTo(most), count, most)) {
      BigFraction sum =
          tuple.stream().map(weights::casimir).reduce(BigFraction.ZERO, BigFraction::add);
      byValue.computeIfAbsent(sum, v -> new ArrayList<>()).add(tuple);
    }
    return byValue.entrySet().stream()
        .map(e -> new Value(e.getKey(), Collections.unmodifiableList(e.getValue())))
        .toList();
  }

  private static List<List<List<Integer>>> tuples(
      Weights weights, List<List<Integer>> all, int count, int most) {
    if (count == 0) {
      return List.of(List.of());
    }
    List<List<List<Integer>>> out = new ArrayList<>();
    for (List<List<Integer>> rest : tuples(weights, all, count - 1, most)) {
      int product = rest.stream().mapToInt(weights::dimension).reduce(1, (a, b) -> a * b);
      for (List<Integer> w : all) {
        if (product * weights.dimension(w) <= most) {
          List<List<Integer>> tuple = new ArrayList<>(rest);
          tuple.add(w);
          out.add(List.copyOf(tuple));
        }
      }
    }
    return out;
  }
}
