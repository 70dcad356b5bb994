package rankfall.report;

import io.pebbletemplates.pebble.extension.escaper.SafeString;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import rankfall.Analysis;
import rankfall.Analysis.Component;
import rankfall.Analysis.Findings;
import rankfall.spec.Spec;

/**
 * What the page shows, in its order. A {@code SafeString} is finished markup, a {@code String}
 * plain text that the template escapes; a list is empty where there is nothing to show.
 *
 * @param family its name
 * @param title its title, or its name
 * @param titled whether the spec gives a title
 * @param status {@code complete}, {@code incomplete} or {@code failed}
 * @param statusWords the same as a sentence
 * @param message the first thing to read of a family that is not complete; may be empty
 * @param noGeneralPoint what stands in place of the answer where there are no components
 * @param undecided sentences
 * @param remarks sentences
 * @param notes plain text of the spec; may be empty
 * @param setting ground and convention, a sentence
 * @param parameters the parameters as a formula; empty without parameters
 * @param where conditions on them
 * @param generators the listed generators as a formula
 * @param relations rows of the table of relations
 * @param poles polynomials
 * @param components the components
 * @param strata rows of the table of strata
 * @param diagram the closure diagram; empty without strata
 * @param regions rows of the table of regions
 * @param contractions rows of the table of contracted algebras
 * @param contractionWords what that table shows
 * @param forms torus, Casimir elements and invariant forms
 * @param maps the region maps; one or none
 * @param scans the default grid; one or none
 * @param citation a line
 * @param version of the program
 * @param sha256 of the spec
 */
record PageView(
    String family,
    String title,
    boolean titled,
    String status,
    String statusWords,
    String message,
    String noGeneralPoint,
    List<String> undecided,
    List<String> remarks,
    String notes,
    String setting,
    List<SafeString> parameters,
    List<SafeString> where,
    List<SafeString> generators,
    List<RelationView> relations,
    List<SafeString> poles,
    List<ComponentView> components,
    List<StratumView> strata,
    List<SafeString> diagram,
    List<RegionView> regions,
    List<ContractionView> contractions,
    String contractionWords,
    FormsView forms,
    List<MapView> maps,
    List<ScanView> scans,
    String citation,
    String version,
    String sha256) {

  /** A relation and why it holds. */
  record RelationView(SafeString formula, String origin) {}

  /** A locus of degeneration. */
  record ConditionView(
      SafeString formula, String multiplicity, String rank, SafeString kernel, String realPoints) {}

  /** An entry of a large matrix. */
  record EntryView(SafeString row, SafeString column, SafeString value) {}

  /**
   * A symmetric matrix: as one formula, or by its entries where it is too large; both empty for 0.
   */
  record MatrixView(List<SafeString> whole, List<EntryView> entries) {}

  /** A component. */
  record ComponentView(
      int number,
      String heading,
      List<SafeString> equations,
      int parameterDimension,
      String general,
      String conditionsWords,
      List<ConditionView> conditions,
      List<SafeString> brackets,
      SafeString basis,
      int dimension,
      MatrixView killing,
      List<SafeString> determinant,
      List<SafeString> kernel,
      List<SafeString> blocks,
      String withoutDeterminant,
      List<MatrixView> dual,
      String withoutInverse) {}

  /** A stratum. */
  record StratumView(
      String name,
      List<SafeString> equations,
      List<SafeString> exclusions,
      int codimension,
      int dimension,
      int rank,
      int derived,
      int centre,
      int radical,
      int nilradical,
      String kind,
      List<SafeString> type,
      String realPoints,
      List<SafeString> witness,
      List<SafeString> kernel,
      List<String> remarks) {}

  /** A real region; the first one of a stratum opens a group of rows. */
  record RegionView(
      String stratum,
      boolean opensStratum,
      String stratumWords,
      String name,
      List<SafeString> chips,
      List<SafeString> conditions,
      String signature,
      List<SafeString> type,
      String otherNames,
      boolean everywhere,
      String proof,
      List<SafeString> witness) {}

  /** What the brackets of a component become in a stratum; numbers are empty without a limit. */
  record ContractionView(
      String stratum,
      String component,
      boolean decided,
      String dimension,
      String rank,
      String derived,
      String centre,
      List<SafeString> type,
      String lead,
      List<SafeString> brackets) {}

  /** The page of an analysis of any status. */
  static PageView of(Analysis a) {
    PageParts parts = new PageParts(a);
    Spec spec = a.spec();
    Optional<Findings> f = a.findings();
    Contents contents = Contents.of(a);
    List<Component> components = f.map(Findings::components).orElse(List.of());
    return new PageView(
        spec.family(),
        spec.title().orElse(spec.family()),
        spec.title().isPresent(),
        a.status().name().toLowerCase(Locale.ROOT),
        Words.status(a),
        a.message(),
        Words.NO_GENERAL_POINT,
        a.undecided(),
        a.remarks(),
        spec.notes().orElse("").strip(),
        Words.setting(spec),
        parts.names(spec.parameters()),
        spec.where().stream().map(c -> parts.text(c.text())).toList(),
        parts.names(f.map(Findings::listed).orElse(spec.presentation().generators())),
        f.map(x -> x.relations().stream().map(parts::relation).toList()).orElse(List.of()),
        f.map(x -> x.poles().stream().map(parts::polynomial).toList()).orElse(List.of()),
        components.stream().map(c -> parts.component(c, components.size())).toList(),
        f.map(x -> x.strata().stream().map(parts::stratum).toList()).orElse(List.of()),
        contents.hasStrata() ? f.map(parts::diagram).stream().toList() : List.of(),
        f.map(parts::regions).orElse(List.of()),
        f.map(x -> x.contractions().stream().map(parts::contraction).toList()).orElse(List.of()),
        Words.CONTRACTIONS,
        FormsView.of(a),
        f.map(parts::maps).orElse(List.of()),
        f.map(parts::scans).orElse(List.of()),
        Words.citation(a),
        a.version(),
        spec.source().sha256());
  }
}
