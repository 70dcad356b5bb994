package rankfall.scan;

import java.util.List;
import java.util.stream.Collectors;

/**
 * All combinations of the values of some axes; the last axis changes fastest.
 *
 * @param axes one a name
 */
public record Grid(List<Axis> axes) implements Lattice {
  /**
   * Copies the list.
   *
   * @throws IllegalArgumentException if there are more than 2^62 points; the message is for the
   *     user
   */
  public Grid {
    axes = List.copyOf(axes);
    long size = 1;
    for (Axis a : axes) {
      if (a.size() > (1L << 62) / size) {
        throw new IllegalArgumentException("the grid has more than 4 * 10^18 points");
      }
      size *= a.size();
    }
  }

  @Override
  public List<String> names() {
    return axes.stream().map(Axis::name).toList();
  }

  @Override
  public long size() {
    long size = 1;
    for (Axis a : axes) {
      size *= a.size();
    }
    return size;
  }

  @Override
  public String text() {
    return "grid " + axes.stream().map(Axis::text).collect(Collectors.joining(","));
  }

  @Override
  public List<Long> denominators() {
    return axes.stream().map(Axis::denominator).toList();
  }

  @Override
  public List<Long> reaches() {
    return axes.stream().map(Axis::reach).toList();
  }

  /** The last axis with more than one value. */
  @Override
  public int inner() {
    for (int v = axes.size() - 1; v > 0; v--) {
      if (axes.get(v).size() > 1) {
        return v;
      }
    }
    return 0;
  }

  @Override
  public long lineLength() {
    return axes.isEmpty() ? 1 : axes.get(inner()).size();
  }

  @Override
  public void put(long number, long[] to) {
    long rest = number;
    for (int v = axes.size() - 1; v >= 0; v--) {
      Axis a = axes.get(v);
      to[v] = a.numerator(rest % a.size());
      rest /= a.size();
    }
  }

  @Override
  public long innerAt(long number) {
    Axis a = axes.get(inner());
    return a.numerator(number % a.size());
  }
}
