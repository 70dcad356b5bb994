package rankfall.scan;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import rankfall.exact.Polynomial;
import rankfall.exact.Term;
import rankfall.exact.Variables;

/**
 * A polynomial whose coefficients hold algebraic numbers: its value, a number of the field, is made
 * exactly, and the field tells the sign.
 */
final class NumberForm extends SignForm {
  private final Variables ring;
  private final List<List<Integer>> numbers;
  private final List<Monomials> parts;
  private final NumberSigns signs;
  private final int inner;

  /**
   * A form.
   *
   * @param p the polynomial
   * @param inner the coordinate along the line, or -1 if there is none
   * @param signs of the values
   */
  NumberForm(NumberPolynomial p, int inner, NumberSigns signs) {
    super(inner >= 0 && p.degree(inner) > 0);
    this.ring = p.ring();
    this.numbers = List.copyOf(p.parts().keySet());
    this.parts = p.parts().values().stream().map(Monomials::new).toList();
    this.inner = inner;
    this.signs = signs;
  }

  @Override
  void enter(Coordinates at) {
    // nothing is the same along the line
  }

  @Override
  int here(Coordinates at) {
    if (inner >= 0) {
      at.set(inner, at.inner());
    }
    List<Term> out = new ArrayList<>();
    for (int k = 0; k < parts.size(); k++) {
      BigInteger value = parts.get(k).value(at);
      if (value.signum() != 0) {
        out.add(new Term(value, numbers.get(k)));
      }
    }
    return signs.sign(Polynomial.of(ring, out));
  }
}
