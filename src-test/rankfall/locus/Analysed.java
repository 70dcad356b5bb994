package rankfall.locus;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Collectors;
import rankfall.Analysis;
import rankfall.Budget;
import rankfall.Engine;
import rankfall.exact.Chain;
import rankfall.exact.Polynomial;
import rankfall.lie.Family;
import rankfall.lie.FamilyRelation;
import rankfall.published.PublishedTables;
import rankfall.spec.Spec;
import rankfall.spec.SpecException;
import rankfall.spec.SpecReader;

/**
 * A family with its analysis, for tests that look at its strata.
 *
 * @param spec the family
 * @param analysis by the engine, complete
 */
record Analysed(Spec spec, Analysis analysis) {

  /** A family of the published tables. */
  static Analysed published(String id) {
    return text(
        PublishedTables.all().stream()
            .filter(e -> e.id().equals(id))
            .findFirst()
            .orElseThrow(() -> new IllegalArgumentException("no entry " + id))
            .spec());
  }

  /** A family that ships, the first one of its file. */
  static Analysed shipped(String file) {
    try {
      return text(Files.readString(Path.of("specs", file + ".yaml")));
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  /** A family by the text of its spec. */
  static Analysed text(String yaml) {
    try {
      Spec spec =
          SpecReader.read("test.yaml", yaml.getBytes(StandardCharsets.UTF_8)).get(0).orThrow();
      Analysis analysis = Engine.analyse(spec, Budget.DEFAULT);
      if (analysis.status() != Analysis.Status.COMPLETE) {
        throw new IllegalStateException(analysis.message());
      }
      return new Analysed(spec, analysis);
    } catch (SpecException e) {
      throw new IllegalArgumentException(e.diagnostics().toString(), e);
    }
  }

  /** The polynomials that a spec wants to vanish. */
  static List<Polynomial> relations(String yaml) {
    try {
      Spec spec =
          SpecReader.read("test.yaml", yaml.getBytes(StandardCharsets.UTF_8)).get(0).orThrow();
      return Family.of(spec).relations().stream().map(FamilyRelation::polynomial).toList();
    } catch (SpecException e) {
      throw new IllegalArgumentException(e.diagnostics().toString(), e);
    }
  }

  List<Analysis.Stratum> strata() {
    return analysis.findings().orElseThrow().strata();
  }

  /** The chain of the algebraic numbers of the family's ring. */
  Chain constants() {
    try {
      return Family.of(spec).ring().constants();
    } catch (SpecException e) {
      throw new IllegalStateException(e);
    }
  }

  /** The strata as the tables write them: equations and profile, a line each. */
  List<String> rows() {
    return strata().stream().map(s -> text(s.equations()) + " " + profile(s)).toList();
  }

  /** The only stratum with this profile. */
  Analysis.Stratum with(int dimension, int rank, int derived, int centre) {
    List<Analysis.Stratum> found = all(dimension, rank, derived, centre);
    if (found.size() != 1) {
      throw new IllegalStateException(found.size() + " of that profile in " + rows());
    }
    return found.get(0);
  }

  /** All strata with this profile. */
  List<Analysis.Stratum> all(int dimension, int rank, int derived, int centre) {
    Profile p = new Profile(dimension, rank, derived, centre);
    return strata().stream().filter(s -> profileOf(s).equals(p)).toList();
  }

  static Profile profileOf(Analysis.Stratum s) {
    return new Profile(s.dimension(), s.rank(), s.derived(), s.centre());
  }

  static String profile(Analysis.Stratum s) {
    return "(" + s.dimension() + "," + s.rank() + "," + s.derived() + "," + s.centre() + ")";
  }

  static String text(List<Polynomial> equations) {
    return equations.isEmpty()
        ? "0"
        : equations.stream().map(Polynomial::toString).collect(Collectors.joining("; "));
  }
}
