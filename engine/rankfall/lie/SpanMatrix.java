package rankfall.lie;

import java.util.Collections;
import java.util.SortedMap;
import java.util.TreeMap;

/**
 * A generator made free of fractions: the matrix {@code re + i*im} is scale times the generator.
 *
 * @param name of the generator
 * @param re non-zero entries by position, row * order + column, both from 0
 * @param im the same for the imaginary parts; empty over a complex ground
 * @param scale not 0
 * @param <E> the elements
 */
public record SpanMatrix<E>(
    String name, SortedMap<Integer, E> re, SortedMap<Integer, E> im, E scale) {
  /** Copies the maps. */
  public SpanMatrix {
    re = Collections.unmodifiableSortedMap(new TreeMap<>(re));
    im = Collections.unmodifiableSortedMap(new TreeMap<>(im));
  }
}
