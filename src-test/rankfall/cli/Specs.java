package rankfall.cli;

import java.util.Collections;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import rankfall.spec.Diagnostic;
import rankfall.spec.Place;
import rankfall.spec.Spec;
import rankfall.spec.SpecResult;

/** Smallest documents for tests of the command line. */
final class Specs {
  private Specs() {}

  /** An abelian family with one generator, named on the given line of its file. */
  static SpecResult.Read read(String family, String file, int line, String... parameters) {
    List<String> lines = Collections.nCopies(line, "family: " + family);
    return new SpecResult.Read(
        new Spec(
            family,
            Optional.empty(),
            Optional.empty(),
            Spec.Ground.REAL,
            Spec.Convention.DIRECT,
            List.of(parameters),
            List.of(),
            List.of(),
            List.of(),
            new Spec.Brackets(List.of("X"), List.of()),
            List.of(),
            Map.of(),
            Map.of(),
            new Spec.Source(
                file, lines, "", new Place(file, line, 9, family.length()), List.of())));
  }

  /** A document with one fault. */
  static SpecResult.Faulty faulty(String family, String file) {
    return new SpecResult.Faulty(
        Optional.of(family),
        List.of(
            new Diagnostic(
                new Place(file, 2, 7, 3), "title: bad", "no title", Optional.of("write a title"))));
  }
}
