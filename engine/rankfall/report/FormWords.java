package rankfall.report;

import java.util.stream.Collectors;
import java.util.stream.IntStream;
import rankfall.Forms.Angle;
import rankfall.Forms.Existence;
import rankfall.Forms.Extent;
import rankfall.Forms.InvariantForms;
import rankfall.Forms.InverseMember;
import rankfall.Forms.TorusForm;

/** Sentences about torus, Casimir element and invariant forms. */
final class FormWords {
  /** What the chapter on invariant forms shows. */
  static final String INVARIANT =
      "Symmetric bilinear forms B with B([x,y],z) + B(y,[x,z]) = 0, at the general point of each"
          + " stratum. One that is not degenerate can stand in for the Killing form where that is"
          + " degenerate.";

  /** What the Casimir element is. */
  static final String CASIMIR =
      "The sum of the products of two basis elements with the entries of the inverse form as"
          + " coefficients. It was checked that it commutes with every generator; in the adjoint"
          + " representation it is the identity.";

  private FormWords() {}

  /**
   * On which span the form is, a clause before the list of elements.
   *
   * @param hermitian whether the listed elements are i times those of the algebra
   */
  static String span(TorusForm t, boolean hermitian) {
    if (!t.imaginary()) {
      return "The form on the real span of";
    }
    return hermitian
        ? "The elements of the algebra are \u2212i times the listed ones, and for some real parameters"
            + " the form is negative definite on them; on the real span of the listed ones it has"
            + " the opposite sign, and is given there:"
        : "For some real parameters the form is negative definite on the torus; it is given on the"
            + " real span of i times its elements:";
  }

  /** Where the form is positive definite, before the conditions. */
  static String positive(TorusForm t) {
    return t.positive()
        .map(
            p ->
                !p.somewhere()
                    ? "It is positive definite for no real parameters."
                    : p.conditions().isEmpty()
                        ? "It is positive definite for all real parameters."
                        : "It is positive definite exactly where")
        .orElse("");
  }

  /** The angle in degrees. */
  static String degrees(Angle a) {
    return a.degrees().map(d -> d + "\u00b0").orElse("");
  }

  /** Whether there is a non-degenerate form. */
  static String existence(Existence e) {
    return switch (e) {
      case YES -> "yes";
      case NO -> "no";
      case UNKNOWN -> "not decided";
    };
  }

  /** The dimension of the space of forms. */
  static String dimension(InvariantForms f) {
    return f.extent() == Extent.UNDECIDED ? "\u2013" : Integer.toString(f.dimension());
  }

  /** What stands in place of the general member; empty where it is given. */
  static String extent(InvariantForms f) {
    return switch (f.extent()) {
      case SEMISIMPLE ->
          f.dimension() == 1
              ? "multiples of the Killing form"
              : "over the complex numbers a multiple of the Killing form on each simple ideal";
      case ABELIAN -> "every symmetric form";
      case LONG -> "too long to be listed";
      case UNDECIDED -> "not decided: the computation would be too long";
      case LISTED -> f.dimension() == 0 ? "only 0" : "";
    };
  }

  /** Of which member the inverse is, before its entries. */
  static String inverse(InverseMember m, InvariantForms f) {
    if (m.weights().isEmpty()) {
      return "Inverse:";
    }
    return "Inverse for "
        + IntStream.range(0, m.weights().size())
            .filter(k -> m.weights().get(k) != 0)
            .mapToObj(k -> f.coefficients().get(k) + " = " + m.weights().get(k))
            .collect(Collectors.joining(", "))
        + ", else 0:";
  }

  /** What stands after the deviations where they may not be all; empty where they are. */
  static String unsettled(InvariantForms f) {
    return f.settled() || f.extent() == Extent.UNDECIDED
        ? ""
        : "Whether this changes inside the stratum was not decided.";
  }
}
