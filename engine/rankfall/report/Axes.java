package rankfall.report;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.apache.commons.numbers.fraction.BigFraction;
import rankfall.exact.Rationals;

/**
 * A frame with ticks at round fractions, and the way from parameters to places in a picture.
 *
 * @param left of the frame, in units of the picture
 * @param top of the frame
 * @param width of the frame
 * @param height of the frame
 * @param across the horizontal scale
 * @param up the vertical scale
 */
record Axes(double left, double top, double width, double height, Scale across, Scale up) {
  private static final int MOST_TICKS = 8;

  /**
   * One direction.
   *
   * @param label finished markup of the name
   * @param from the value at the left or lower end
   * @param to the value at the right or upper end
   */
  record Scale(String label, BigFraction from, BigFraction to) {
    /** Where a value lies, 0 at the lower end and 1 at the upper one. */
    double share(double value) {
      double low = from.doubleValue();
      return (value - low) / (to.doubleValue() - low);
    }

    /** Round values inside, ascending. */
    List<BigFraction> ticks() {
      BigFraction step = step(to.subtract(from).divide(MOST_TICKS));
      List<BigFraction> out = new ArrayList<>();
      BigFraction at = BigFraction.of(Rationals.ceil(from.divide(step))).multiply(step);
      while (Rationals.compare(at, to) <= 0) {
        out.add(at);
        at = at.add(step);
      }
      return out;
    }
  }

  /** The least of 1, 2, 5 times a power of 10, or 1/2, 1/4 of one, that is not below a number. */
  private static BigFraction step(BigFraction least) {
    BigFraction power = BigFraction.ONE;
    while (Rationals.compare(power, least) < 0) {
      power = power.multiply(10);
    }
    while (Rationals.compare(power.divide(10), least) >= 0) {
      power = power.divide(10);
    }
    for (BigFraction part :
        List.of(BigFraction.of(1, 5), BigFraction.of(1, 4), BigFraction.of(1, 2))) {
      BigFraction s = power.multiply(part);
      boolean readable = Rationals.compare(power, BigFraction.ONE) <= 0 || isWhole(s);
      if (readable && Rationals.compare(s, least) >= 0) {
        return s;
      }
    }
    return power;
  }

  private static boolean isWhole(BigFraction q) {
    return Rationals.denominator(q).equals(BigInteger.ONE);
  }

  /** The horizontal place of a value. */
  double x(double value) {
    return left + width * across.share(value);
  }

  /** The vertical place of a value. */
  double y(double value) {
    return top + height * (1 - up.share(value));
  }

  /** The frame, its ticks and labels. */
  String markup() {
    StringBuilder out = new StringBuilder();
    for (BigFraction t : across.ticks()) {
      out.append(tick(x(t.doubleValue()), top + height, 0, 5));
      out.append(text("tick", x(t.doubleValue()), top + height + 19, number(t)));
    }
    if (!up.label().isEmpty()) {
      for (BigFraction t : up.ticks()) {
        out.append(tick(left, y(t.doubleValue()), -5, 0));
        out.append(text("tick up", left - 9, y(t.doubleValue()) + 4.5, number(t)));
      }
      out.append(text("axis", left, top - 11, up.label()));
    }
    out.append(text("axis", left + width / 2, top + height + 39, across.label()));
    return out.append(
            String.format(
                Locale.ROOT,
                "<rect class=\"frame\" x=\"%.1f\" y=\"%.1f\" width=\"%.1f\" height=\"%.1f\"></rect>\n",
                left,
                top,
                width,
                height))
        .toString();
  }

  private static String tick(double x, double y, int dx, int dy) {
    return String.format(
        Locale.ROOT, "<path class=\"frame\" d=\"M%.1f %.1fl%d %d\"></path>\n", x, y, dx, dy);
  }

  static String text(String style, double x, double y, String markup) {
    return String.format(
        Locale.ROOT, "<text class=\"%s\" x=\"%.1f\" y=\"%.1f\">%s</text>\n", style, x, y, markup);
  }

  /** A fraction with a true minus sign. */
  static String number(BigFraction q) {
    return Rationals.text(q).replace('-', '\u2212');
  }
}
