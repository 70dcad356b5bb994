package rankfall.lie;

import java.util.Optional;
import rankfall.spec.Diagnostic;
import rankfall.spec.Place;
import rankfall.spec.Spec;

/** A fault found while an expression is evaluated; it becomes a diagnostic of the spec. */
final class FamilyFault extends RuntimeException {
  private static final long serialVersionUID = 1L;

  private final transient Place place;
  private final transient Optional<String> advice;

  FamilyFault(Place place, String cause, String advice) {
    super(cause);
    this.place = place;
    this.advice = Optional.of(advice);
  }

  FamilyFault(Place place, String cause) {
    super(cause);
    this.place = place;
    this.advice = Optional.empty();
  }

  Diagnostic in(Spec spec) {
    return spec.source().fault(place, getMessage(), advice);
  }
}
