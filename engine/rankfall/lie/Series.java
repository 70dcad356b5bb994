package rankfall.lie;

import java.util.ArrayList;
import java.util.List;
import java.util.SortedMap;

/**
 * A falling chain of ideals: the derived series or the lower central series (Humphreys,
 * Introduction to Lie Algebras, sections 3.1 and 3.2).
 *
 * @param terms the algebra itself, then each strictly smaller term once
 * @param next the term after the last, which has the same dimension as the last; its assumptions
 *     are those under which the series does not fall further
 * @param <E> the coordinates
 */
public record Series<E>(List<Subspace<E>> terms, Subspace<E> next) {
  /** Copies the terms. */
  public Series {
    terms = List.copyOf(terms);
  }

  /** The derived series: each term is spanned by the brackets within the one before. */
  public static <E> Series<E> derived(LieBracket<E> bracket) {
    return of(bracket, false);
  }

  /** The lower central series: each term is spanned by brackets of anything with the one before. */
  public static <E> Series<E> lowerCentral(LieBracket<E> bracket) {
    return of(bracket, true);
  }

  private static <E> Series<E> of(LieBracket<E> bracket, boolean central) {
    Subspace<E> whole = Subspace.whole(bracket.domain(), bracket.dimension());
    List<Subspace<E>> terms = new ArrayList<>(List.of(whole));
    Subspace<E> last = whole;
    while (true) {
      Subspace<E> next = central ? Ideals.bracket(bracket, whole, last) : square(bracket, last);
      if (next.dimension() == last.dimension()) {
        return new Series<>(terms, next);
      }
      terms.add(next);
      last = next;
    }
  }

  private static <E> Subspace<E> square(LieBracket<E> bracket, Subspace<E> u) {
    List<SortedMap<Integer, E>> out = new ArrayList<>();
    for (int a = 0; a < u.dimension(); a++) {
      for (int b = a + 1; b < u.dimension(); b++) {
        out.add(bracket.of(u.basis().get(a), u.basis().get(b)));
      }
    }
    return Subspace.span(bracket.domain(), bracket.dimension(), out);
  }

  /**
   * The dimensions, each once.
   *
   * @return {@code [3]} for a perfect algebra of dimension 3, {@code [0]} in dimension 0
   */
  public List<Integer> dimensions() {
    return terms.stream().map(Subspace::dimension).toList();
  }

  /** Whether the series ends in 0. */
  public boolean reachesZero() {
    return terms.get(terms.size() - 1).dimension() == 0;
  }
}
