package rankfall.scan;

import java.util.List;
import java.util.stream.Collectors;
import org.apache.commons.numbers.fraction.BigFraction;

/**
 * Points drawn uniformly, each independent of the others: every value is one of {@link #PARTS} + 1
 * equally spaced fractions from one bound to the other, so that denominators stay bounded.
 *
 * <p>Point k is made from the seed and k alone (the generator SplitMix64 of Steele, Lea and Flood
 * 2014, asked at any place of its sequence), so that any part of a sample can be had by itself. The
 * draw among N values takes the upper half of a 64-bit product and favours none by more than N /
 * 2^64.
 *
 * @param ranges an axis of PARTS + 1 steps a name, or of one value
 * @param size how many points
 * @param seed any
 */
public record Sample(List<Axis> ranges, long size, long seed) implements Lattice {
  /** How many parts a range has. */
  public static final long PARTS = 1_000_000;

  private static final long GOLDEN = 0x9E3779B97F4A7C15L;

  /** Copies the list. */
  public Sample {
    ranges = List.copyOf(ranges);
  }

  /**
   * The values that one parameter may take.
   *
   * @param name of the parameter
   * @param from one bound
   * @param to the other one, above it
   * @throws IllegalArgumentException as {@link Axis#steps}
   */
  public static Axis range(String name, BigFraction from, BigFraction to) {
    return Axis.steps(name, from, to, PARTS + 1);
  }

  @Override
  public List<String> names() {
    return ranges.stream().map(Axis::name).toList();
  }

  @Override
  public String text() {
    return "sample "
        + size
        + " seed "
        + seed
        + " range "
        + ranges.stream().map(Axis::text).collect(Collectors.joining(","));
  }

  @Override
  public List<Long> denominators() {
    return ranges.stream().map(Axis::denominator).toList();
  }

  @Override
  public List<Long> reaches() {
    return ranges.stream().map(Axis::reach).toList();
  }

  @Override
  public int inner() {
    return Math.max(0, ranges.size() - 1);
  }

  @Override
  public long lineLength() {
    return 1;
  }

  @Override
  public void put(long number, long[] to) {
    for (int v = 0; v < ranges.size(); v++) {
      to[v] = value(number, v);
    }
  }

  @Override
  public long innerAt(long number) {
    return value(number, inner());
  }

  private long value(long number, int v) {
    Axis a = ranges.get(v);
    return a.numerator(below(mixed(number * ranges.size() + v), a.size()));
  }

  /** The output of SplitMix64 at a place of its sequence. */
  private long mixed(long place) {
    long z = seed + (place + 1) * GOLDEN;
    z = (z ^ (z >>> 30)) * 0xBF58476D1CE4E5B9L;
    z = (z ^ (z >>> 27)) * 0x94D049BB133111EBL;
    return z ^ (z >>> 31);
  }

  /** A number from 0 to size - 1. */
  private static long below(long random, long size) {
    long high = Math.multiplyHigh(random, size);
    return random < 0 ? high + size : high;
  }
}
