package rankfall.spec;

import java.util.Optional;

/** Leaves a deep parse with one fault; it never leaves the room. */
final class SpecFault extends RuntimeException {
  private static final long serialVersionUID = 1L;

  private final transient Place place;
  private final transient Optional<String> advice;

  private SpecFault(Place place, String cause, Optional<String> advice) {
    super(cause, null, false, false);
    this.place = place;
    this.advice = advice;
  }

  static SpecFault of(Place place, String cause) {
    return new SpecFault(place, cause, Optional.empty());
  }

  static SpecFault of(Place place, String cause, String advice) {
    return new SpecFault(place, cause, Optional.of(advice));
  }

  Place place() {
    return place;
  }

  Optional<String> advice() {
    return advice;
  }
}
