package rankfall.lie;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.SortedMap;
import java.util.TreeMap;
import rankfall.exact.Chain;
import rankfall.exact.ChainFractions;
import rankfall.exact.Elimination;
import rankfall.exact.Polynomial;
import rankfall.exact.RationalFunction;

/**
 * Elements of an algebra that are to commute and to be independent, at the general point of a set.
 *
 * <p>Inside, coordinates belong to the basis y of the structure constants (y_i = scale_i e_i); an
 * element is kept as a multiple of itself without fractions.
 */
public final class CommutingElements {
  private final Chain chain;
  private final StructureConstants<Polynomial> constants;
  private final LieBracket<Polynomial> bracket;
  private final List<Multiple> elements;

  /**
   * A multiple of an element.
   *
   * @param vector factor times the element
   * @param factor not 0
   */
  private record Multiple(SortedMap<Integer, Polynomial> vector, Polynomial factor) {}

  private CommutingElements(
      Chain chain, StructureConstants<Polynomial> constants, List<Multiple> elements) {
    this.chain = chain;
    this.constants = constants;
    this.bracket = LieBracket.of(constants);
    this.elements = List.copyOf(elements);
  }

  /**
   * Elements of an algebra.
   *
   * @param chain the set over which the constants are given
   * @param constants brackets of the basis e_i
   * @param vectors coordinates in the basis e_i
   */
  public static CommutingElements of(
      Chain chain, StructureConstants<Polynomial> constants, List<List<RationalFunction>> vectors) {
    return new CommutingElements(
        chain, constants, vectors.stream().map(v -> multiple(chain, constants, v)).toList());
  }

  private static Multiple multiple(
      Chain chain, StructureConstants<Polynomial> constants, List<RationalFunction> vector) {
    Polynomial factor = chain.one();
    List<RationalFunction> scaled = new ArrayList<>();
    for (int i = 0; i < vector.size(); i++) {
      RationalFunction f = vector.get(i).over(RationalFunction.of(constants.scale().get(i)));
      scaled.add(f);
      factor = factor.times(f.denominator().over(factor.gcd(f.denominator())));
    }
    SortedMap<Integer, Polynomial> out = new TreeMap<>();
    for (int i = 0; i < scaled.size(); i++) {
      RationalFunction f = scaled.get(i);
      if (!f.isZero()) {
        out.put(i, f.numerator().times(factor.over(f.denominator())));
      }
    }
    return new Multiple(out, factor);
  }

  /** The number of elements. */
  public int count() {
    return elements.size();
  }

  /** The set. */
  Chain chain() {
    return chain;
  }

  /** The dimension of the algebra. */
  int ambient() {
    return constants.dimension();
  }

  /**
   * The first two elements that do not commute.
   *
   * @return their positions; empty if all commute
   */
  public Optional<List<Integer>> clash() {
    Vectors<Polynomial> vectors = new Vectors<>(chain);
    for (int i = 0; i < elements.size(); i++) {
      for (int j = i + 1; j < elements.size(); j++) {
        SortedMap<Integer, Polynomial> x =
            bracket.of(elements.get(i).vector, elements.get(j).vector);
        if (x.values().stream().anyMatch(v -> !vectors.vanishes(v))) {
          return Optional.of(List.of(i, j));
        }
      }
    }
    return Optional.empty();
  }

  /**
   * The first element that is a combination of those before it.
   *
   * @return its position; empty if all are independent
   */
  public Optional<Integer> dependent() {
    List<SortedMap<Integer, Polynomial>> rows = new ArrayList<>();
    for (int k = 0; k < elements.size(); k++) {
      rows.add(elements.get(k).vector);
      if (Elimination.of(chain, rows, ambient()).rank() <= k) {
        return Optional.of(k);
      }
    }
    return Optional.empty();
  }

  /** The dimension of the space of all x that commute with every element. */
  public int centraliser() {
    List<SortedMap<Integer, Polynomial>> equations = new ArrayList<>();
    for (Multiple x : elements) {
      equations.addAll(SpanRows.transposed(bracket.adjoint(x.vector)));
    }
    return ambient() - Elimination.of(chain, equations, ambient()).rank();
  }

  /**
   * The matrices of ad of each element, transposed, without fractions.
   *
   * @return per element n sparse rows, each {@link #divisors} times too large
   */
  List<List<SortedMap<Integer, Polynomial>>> adjoints() {
    return elements.stream().map(x -> bracket.adjoint(x.vector)).toList();
  }

  /** By what the matrices of {@link #adjoints} are to be divided. */
  List<Polynomial> divisors() {
    return elements.stream().map(x -> x.factor.times(constants.denominator())).toList();
  }

  /** A quotient in canonical form on the set. */
  RationalFunction canonical(Polynomial above, Polynomial below) {
    return ChainFractions.canonical(chain, above, below);
  }
}
