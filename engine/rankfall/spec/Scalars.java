package rankfall.spec;

import java.util.Optional;
import org.apache.commons.numbers.fraction.BigFraction;

/** Reads scalars that hold one number or one integer. */
final class Scalars {
  private static final int MAX_INTEGER_DIGITS = 9;

  private Scalars() {}

  /** The text of a node; any other node is a fault that says what should stand there. */
  static ScalarText text(YamlNode node, String wanted) {
    if (node instanceof YamlNode.Text text && !text.text().isNull()) {
      return text.text();
    }
    boolean empty = node instanceof YamlNode.Text;
    throw SpecFault.of(
        node.place(), (empty ? "nothing" : node.kind()) + " stands here", "write " + wanted);
  }

  /** An exact rational number, which may be written as an expression of numbers. */
  static BigFraction number(YamlNode node, String setting) {
    ScalarText text = text(node, "a number, such as 1/2 or 0.25");
    Expression e = ExpressionReader.read(text, Scope.ofAnyName(setting));
    return RationalValue.of(e)
        .orElseThrow(
            () ->
                SpecFault.of(
                    text.place(),
                    setting + " is no rational number",
                    "write a number, such as 1/2 or 0.25"));
  }

  static int integer(ScalarText text, String setting, int least, int most) {
    String digits = text.value();
    boolean plain = digits.matches("[0-9]{1," + MAX_INTEGER_DIGITS + "}");
    Optional<Integer> value = plain ? Optional.of(Integer.parseInt(digits)) : Optional.empty();
    return value
        .filter(v -> least <= v && v <= most)
        .orElseThrow(
            () ->
                SpecFault.of(
                    text.place(),
                    "'" + setting + "' cannot be " + shortened(digits),
                    "write an integer from " + least + " to " + most));
  }

  private static String shortened(String text) {
    return text.length() > 20 ? "that" : "'" + text + "'";
  }
}
