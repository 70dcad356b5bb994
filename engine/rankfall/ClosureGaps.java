package rankfall;

import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;
import rankfall.exact.Polynomial;
import rankfall.lie.Family;
import rankfall.lie.FamilySite;
import rankfall.lie.Span;

/** Which brackets leave the span of a family at its general point, in words. */
final class ClosureGaps {
  private ClosureGaps() {}

  static Optional<String> of(Family family) {
    if (!(family.generic() instanceof FamilySite.Algebraic at)
        || !(Span.of(at.input()) instanceof Span.Open<Polynomial> open)) {
      return Optional.empty();
    }
    List<String> brackets =
        open.missing().stream()
            .map(
                m ->
                    m.generators().stream()
                        .map(open.names()::get)
                        .collect(Collectors.joining(", ", "[", "]")))
            .toList();
    return Optional.of(
        "missing are the directions of "
            + String.join(", ", brackets)
            + "; add them as generators or write 'closure: generate'");
  }
}
