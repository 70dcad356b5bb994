package rankfall.lie;

import java.util.Map;
import java.util.SortedMap;
import java.util.TreeMap;
import rankfall.exact.Domain;

/** The bracket {@code a*b - b*a} of sparse complex matrices. */
final class SpanCommutator {
  private SpanCommutator() {}

  /** The bracket, not in normal form; its scale is the product of the scales. */
  static <E> SpanMatrix<E> of(Domain<E> domain, int order, SpanMatrix<E> a, SpanMatrix<E> b) {
    SortedMap<Integer, E> out = new TreeMap<>();
    int im = order * order;
    add(domain, order, out, 0, a.re(), b.re(), false);
    add(domain, order, out, 0, a.im(), b.im(), true);
    add(domain, order, out, im, a.re(), b.im(), false);
    add(domain, order, out, im, a.im(), b.re(), false);
    SortedMap<Integer, E> imaginary = new TreeMap<>();
    out.tailMap(im).forEach((k, v) -> imaginary.put(k - im, v));
    return new SpanMatrix<>(
        "[" + a.name() + "," + b.name() + "]",
        out.headMap(im),
        imaginary,
        domain.times(a.scale(), b.scale()));
  }

  /** Adds {@code a*b - b*a}, or its negative, at positions from {@code shift} on. */
  private static <E> void add(
      Domain<E> domain,
      int order,
      Map<Integer, E> to,
      int shift,
      SortedMap<Integer, E> a,
      SortedMap<Integer, E> b,
      boolean negative) {
    if (a.isEmpty() || b.isEmpty()) {
      return;
    }
    product(domain, order, to, shift, a, b, negative);
    product(domain, order, to, shift, b, a, !negative);
  }

  private static <E> void product(
      Domain<E> domain,
      int order,
      Map<Integer, E> to,
      int shift,
      SortedMap<Integer, E> a,
      SortedMap<Integer, E> b,
      boolean negative) {
    a.forEach(
        (p, x) -> {
          int row = p / order * order;
          int middle = p % order * order;
          E factor = negative ? domain.negate(x) : x;
          b.subMap(middle, middle + order)
              .forEach(
                  (q, y) ->
                      to.merge(shift + row + q % order, domain.times(factor, y), domain::plus));
        });
  }
}
