package rankfall.identify;

import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import java.util.function.Function;
import java.util.stream.Stream;

/**
 * The type of a simple complex algebra by its dimension and, where that does not decide, by
 * refuting all types but one: by {@link TraceIdentities}, or by an element whose centraliser is
 * smaller than the rank.
 */
final class TypeByTraces {
  private static final int TRIES = 6;
  private static final long SEED = 1888;

  private TypeByTraces() {}

  /**
   * A residue of an algebra in which the simple one lies as an ideal.
   *
   * @param algebra all of it
   * @param element a random element of the ideal; empty where the residue does not serve
   */
  record Sample(ModularAlgebra algebra, Function<Random, Optional<long[]>> element) {}

  /**
   * The type.
   *
   * @param dimension of the simple algebra
   * @param samples endless
   * @return empty if more than one type is left
   */
  static Optional<SimpleType> of(int dimension, Stream<Sample> samples) {
    List<SimpleType> candidates = SimpleType.ofDimension(dimension);
    if (candidates.size() == 1) {
      return Optional.of(candidates.get(0));
    }
    Random random = new Random(SEED);
    return samples
        .map(s -> s.element().apply(random).map(x -> left(candidates, s.algebra(), x)))
        .flatMap(Optional::stream)
        .limit(TRIES)
        .filter(left -> left.size() == 1)
        .findFirst()
        .map(left -> left.get(0));
  }

  private static List<SimpleType> left(
      List<SimpleType> candidates, ModularAlgebra algebra, long[] x) {
    int count = candidates.stream().mapToInt(TraceIdentities::traces).max().orElse(0);
    long[] traces = algebra.evenTraces(x, count);
    if (Arrays.stream(traces).allMatch(t -> t == 0)) {
      return candidates;
    }
    int unlike = algebra.centraliser(x) - algebra.dimension();
    return candidates.stream()
        .filter(t -> t.rank() <= unlike + t.dimension())
        .filter(t -> !TraceIdentities.refute(t, traces, algebra.field()))
        .toList();
  }
}
