package rankfall;

import java.math.BigInteger;
import java.util.List;
import org.apache.commons.numbers.fraction.BigFraction;
import rankfall.RegionMap.Axis;
import rankfall.exact.Rationals;

/** Chooses how much of the parameters a picture shows. */
final class MapWindow {
  private static final BigFraction MARGIN = BigFraction.of(1, 8);
  private static final BigFraction UNEQUAL = BigFraction.of(4);
  private static final int STEPS = 5;

  private MapWindow() {}

  /** An axis that shows some values and a margin, 0 in its middle, its ends round. */
  static Axis axis(String variable, List<BigFraction> shown) {
    Range r = Range.of(shown);
    return rounded(variable, r.low.subtract(r.margin()), r.high.add(r.margin()));
  }

  /** Two axes; of equal length unless one would have to be far longer. */
  static List<Axis> axes(
      String x, List<BigFraction> shownAcross, String y, List<BigFraction> shownUp) {
    Range across = Range.of(shownAcross);
    Range up = Range.of(shownUp);
    if (Rationals.compare(across.span(), up.span().multiply(UNEQUAL)) > 0
        || Rationals.compare(up.span(), across.span().multiply(UNEQUAL)) > 0) {
      return List.of(axis(x, shownAcross), axis(y, shownUp));
    }
    BigFraction span = Rationals.max(across.span(), up.span());
    return List.of(widened(x, across, span), widened(y, up, span));
  }

  private record Range(BigFraction low, BigFraction high) {
    static Range of(List<BigFraction> values) {
      BigFraction low = values.stream().reduce(Rationals::min).orElse(BigFraction.ZERO);
      BigFraction high = values.stream().reduce(Rationals::max).orElse(BigFraction.ZERO);
      BigFraction most = Rationals.max(high, low.negate());
      BigFraction half = most.signum() > 0 ? most : BigFraction.ONE;
      return new Range(half.negate(), half);
    }

    BigFraction span() {
      return high.subtract(low);
    }

    BigFraction margin() {
      return span().multiply(MARGIN);
    }
  }

  private static Axis widened(String variable, Range r, BigFraction span) {
    BigFraction half = span.multiply(MARGIN.add(BigFraction.of(1, 2)));
    BigFraction middle = r.low.add(r.high).divide(2);
    return rounded(variable, middle.subtract(half), middle.add(half));
  }

  private static Axis rounded(String variable, BigFraction from, BigFraction to) {
    BigFraction step = step(to.subtract(from).divide(STEPS));
    return new Axis(
        variable,
        BigFraction.of(Rationals.floor(from.divide(step))).multiply(step),
        BigFraction.of(Rationals.ceil(to.divide(step))).multiply(step));
  }

  /** The greatest of 1, 2, 5 times a power of 10 that is not above a positive number. */
  static BigFraction step(BigFraction most) {
    BigFraction power = BigFraction.ONE;
    while (Rationals.compare(power, most) > 0) {
      power = power.divide(10);
    }
    while (Rationals.compare(power.multiply(10), most) <= 0) {
      power = power.multiply(10);
    }
    for (int k : List.of(5, 2)) {
      BigFraction s = power.multiply(BigInteger.valueOf(k));
      if (Rationals.compare(s, most) <= 0) {
        return s;
      }
    }
    return power;
  }
}
