package rankfall.cli;

import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;
import rankfall.spec.SpecResult;

/** Chooses one document of a file. */
final class FamilyChoice {
  private FamilyChoice() {}

  /**
   * The document a call means.
   *
   * @param documents all documents of the file
   * @param name the family asked for; may be empty only if there is one document
   * @return the document, read or faulty
   * @throws IllegalArgumentException if the file holds no such family, or several and none is
   *     named; the message is for the user
   */
  static SpecResult of(List<SpecResult> documents, Optional<String> name) {
    List<SpecResult> fitting =
        documents.stream()
            .filter(document -> name.isEmpty() || name.equals(family(document)))
            .toList();
    if (fitting.size() == 1) {
      return fitting.get(0);
    }
    String known =
        documents.stream()
            .flatMap(document -> family(document).stream())
            .collect(Collectors.joining(", "));
    if (name.isEmpty()) {
      throw new IllegalArgumentException(
          documents.isEmpty()
              ? "the file holds no family"
              : "the file holds several families; choose one with --family: " + known);
    }
    throw new IllegalArgumentException(
        fitting.isEmpty()
            ? "the file holds no family '" + name.get() + "'; it holds " + known
            : "the file describes '" + name.get() + "' more than once");
  }

  private static Optional<String> family(SpecResult document) {
    return document instanceof SpecResult.Read read
        ? Optional.of(read.spec().family())
        : ((SpecResult.Faulty) document).family();
  }
}
