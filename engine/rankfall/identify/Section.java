package rankfall.identify;

import java.util.ArrayList;
import java.util.List;
import java.util.SortedMap;
import java.util.TreeMap;
import java.util.function.Function;
import java.util.stream.IntStream;
import rankfall.lie.LieBracket;
import rankfall.lie.StructureConstants;
import rankfall.lie.Subspace;

/**
 * A subalgebra or quotient of an algebra with elements that represent its basis.
 *
 * @param constants of a multiple of the basis
 * @param factor the constants are the brackets of the basis times this
 * @param representatives elements of the large algebra, one a basis element
 * @param coordinates takes an element of the large algebra (for a subalgebra: of the subalgebra) to
 *     its coordinates times the factor
 */
record Section<E>(
    StructureConstants<E> constants,
    E factor,
    List<SortedMap<Integer, E>> representatives,
    Function<SortedMap<Integer, E>, SortedMap<Integer, E>> coordinates) {

  /** The quotient by an ideal; the other unit vectors represent its basis. */
  static <E> Section<E> quotient(
      Ground<E> ground, LieBracket<E> bracket, List<SortedMap<Integer, E>> ideal) {
    int n = bracket.dimension();
    Ground.Reduced<E> echelon = ground.reduced(ideal, n, n);
    List<Integer> kept =
        IntStream.range(0, n).filter(i -> !echelon.pivots().contains(i)).boxed().toList();
    E factor = echelon.common(ground);
    Function<SortedMap<Integer, E>, SortedMap<Integer, E>> coordinates =
        x -> {
          SortedMap<Integer, E> rest = new TreeMap<>();
          ground.add(rest, factor, x);
          for (int k = 0; k < echelon.pivots().size(); k++) {
            E at = x.get(echelon.pivots().get(k));
            if (at != null) {
              E q = echelon.cofactor(ground, factor, k);
              ground.add(
                  rest,
                  ground.domain().negate(ground.domain().times(q, at)),
                  echelon.rows().get(k));
            }
          }
          SortedMap<Integer, E> out = new TreeMap<>();
          for (int i = 0; i < kept.size(); i++) {
            E v = rest.get(kept.get(i));
            if (v != null) {
              out.put(i, v);
            }
          }
          return shortened(ground, out);
        };
    List<SortedMap<Integer, E>> units = Subspace.whole(ground.domain(), n).basis();
    return of(ground, bracket, kept.stream().map(units::get).toList(), factor, coordinates);
  }

  /** A subalgebra, given by vectors that span it. */
  static <E> Section<E> subalgebra(
      Ground<E> ground, LieBracket<E> bracket, List<SortedMap<Integer, E>> spanning) {
    int n = bracket.dimension();
    Ground.Reduced<E> echelon = ground.reduced(spanning, n, n);
    E factor = echelon.common(ground);
    Function<SortedMap<Integer, E>, SortedMap<Integer, E>> coordinates =
        x -> {
          SortedMap<Integer, E> out = new TreeMap<>();
          for (int k = 0; k < echelon.pivots().size(); k++) {
            E at = x.get(echelon.pivots().get(k));
            if (at != null) {
              out.put(k, ground.domain().times(echelon.cofactor(ground, factor, k), at));
            }
          }
          return shortened(ground, out);
        };
    return of(ground, bracket, echelon.rows(), factor, coordinates);
  }

  private static <E> Section<E> of(
      Ground<E> ground,
      LieBracket<E> bracket,
      List<SortedMap<Integer, E>> basis,
      E factor,
      Function<SortedMap<Integer, E>, SortedMap<Integer, E>> coordinates) {
    SortedMap<StructureConstants.Pair, SortedMap<Integer, E>> brackets = new TreeMap<>();
    for (int i = 0; i < basis.size(); i++) {
      for (int j = i + 1; j < basis.size(); j++) {
        SortedMap<Integer, E> c = coordinates.apply(bracket.of(basis.get(i), basis.get(j)));
        if (!c.isEmpty()) {
          brackets.put(new StructureConstants.Pair(i, j), c);
        }
      }
    }
    return new Section<>(
        Ground.plain(ground.domain(), basis.size(), brackets), factor, basis, coordinates);
  }

  private static <E> SortedMap<Integer, E> shortened(Ground<E> ground, SortedMap<Integer, E> x) {
    List<E> values = ground.shorter().apply(new ArrayList<>(x.values()));
    SortedMap<Integer, E> out = new TreeMap<>();
    int at = 0;
    for (Integer k : x.keySet()) {
      E v = values.get(at++);
      if (!ground.domain().isZero(v)) {
        out.put(k, v);
      }
    }
    return out;
  }

  /** The bracket of the constants. */
  LieBracket<E> bracket() {
    return LieBracket.of(constants);
  }

  /** The dimension. */
  int dimension() {
    return constants.dimension();
  }
}
