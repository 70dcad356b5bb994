package rankfall.spec;

import java.util.Optional;
import org.apache.commons.numbers.fraction.BigFraction;

/** The argument of {@code sqrt}: a rational number that is not negative. */
final class Radicand {
  private Radicand() {}

  static BigFraction of(Expression argument, Place place) {
    Optional<BigFraction> value = RationalValue.of(argument);
    if (value.isEmpty()) {
      throw notRational(argument, place);
    }
    if (value.get().signum() < 0) {
      throw SpecFault.of(
          place,
          "sqrt of a negative number",
          "write i*sqrt(" + short10(value.get().negate()) + ")");
    }
    return value.get();
  }

  private static String short10(BigFraction value) {
    String text =
        value.getDenominator().bitLength() == 1
            ? value.getNumerator().toString()
            : value.getNumerator() + "/" + value.getDenominator();
    return text.length() > 20 ? "..." : text;
  }

  private static SpecFault notRational(Expression argument, Place place) {
    Optional<String> name =
        NameNodes.of(argument).stream()
            .map(Expression.Name::name)
            .filter(n -> !n.equals("i"))
            .findFirst();
    if (name.isPresent()) {
      return SpecFault.of(
          place,
          "sqrt of an expression in '" + name.get() + "'",
          "introduce the root as a parameter, say r, with a relation under 'where', such as r^2 = "
              + name.get());
    }
    return SpecFault.of(
        place,
        "sqrt takes a rational number that is not negative",
        "give another algebraic number under 'constants' by its minimal polynomial");
  }
}
