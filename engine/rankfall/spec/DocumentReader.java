package rankfall.spec;

import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.apache.commons.numbers.fraction.BigFraction;

/** Reads one document into a spec, section by section, and gathers all faults on the way. */
final class DocumentReader {
  static final List<String> KEYS =
      List.of(
          "family",
          "title",
          "notes",
          "ground",
          "convention",
          "parameters",
          "where",
          "constants",
          "abbreviations",
          "order",
          "matrices",
          "brackets",
          "generators",
          "closure",
          "torus",
          "covectors",
          "scan");

  private static final Map<String, Spec.Ground> GROUNDS = grounds();
  private static final Map<String, Spec.Convention> CONVENTIONS = conventions();
  private static final String FAMILY = "[a-z0-9][a-z0-9-]{0,63}";

  private final FileText file;
  private final YamlNode.Mapping root;
  private final Faults faults;
  private final Fields fields;
  private final Names names;

  private DocumentReader(FileText file, YamlNode.Mapping root, Faults faults) {
    this.file = file;
    this.root = root;
    this.faults = faults;
    fields = Fields.of(root, KEYS, faults);
    names = new Names(fields.has("matrices"));
  }

  static SpecResult read(FileText file, YamlNode root) {
    Faults faults = new Faults(file);
    if (!(root instanceof YamlNode.Mapping mapping)) {
      faults.add(
          start(root.place()),
          "a spec is a mapping, not " + root.kind(),
          "begin with a line such as 'family: my-family'");
      return new SpecResult.Faulty(Optional.empty(), faults.inTextOrder());
    }
    return new DocumentReader(file, mapping, faults).result();
  }

  private static Place start(Place place) {
    return new Place(place.file(), place.line(), place.column(), 1);
  }

  private SpecResult result() {
    Optional<ScalarText> family = family();
    Optional<String> title = title();
    Optional<String> notes = fields.text("notes", "notes: Plain text").map(ScalarText::value);
    Spec.Ground ground = fields.choice("ground", GROUNDS);
    Spec.Convention convention = fields.choice("convention", CONVENTIONS);
    ScalarSections scalars = new ScalarSections(fields, names, faults);
    PresentationReader presenter =
        new PresentationReader(fields, names, scalars.open(), start(root.place()), faults);
    presenter.declareListed();
    scalars.readAbbreviations();
    Optional<Spec.Presentation> presentation = presenter.read();
    List<Spec.Condition> where = scalars.where(ground);
    TorusReader torus = new TorusReader(fields, names, scalars.open(), faults);
    List<String> commuting = torus.torus();
    Map<String, Map<String, Expression>> covectors = torus.covectors(commuting);
    Map<String, List<BigFraction>> scan = scan(scalars);
    if (!faults.none() || family.isEmpty() || presentation.isEmpty()) {
      return new SpecResult.Faulty(family.map(ScalarText::value), faults.inTextOrder());
    }
    return new SpecResult.Read(
        new Spec(
            family.get().value(),
            title,
            notes,
            ground,
            convention,
            scalars.parameters(),
            where,
            scalars.constants(),
            scalars.abbreviations(),
            presentation.get(),
            commuting,
            covectors,
            scan,
            new Spec.Source(
                file.name(), file.lines(), file.sha256(), family.get().place(), torus.places())));
  }

  private Optional<ScalarText> family() {
    Optional<ScalarText> text = fields.text("family", "family: my-family");
    if (!fields.has("family")) {
      faults.add(
          start(root.place()),
          "the spec has no 'family'",
          "add a line such as 'family: my-family'");
    }
    if (text.isPresent() && !text.get().value().matches(FAMILY)) {
      faults.add(
          text.get().place(),
          "this cannot be the name of a family",
          "write small letters a-z, digits and '-', at most 64, a letter or digit first");
      return Optional.empty();
    }
    return text;
  }

  private Optional<String> title() {
    Optional<ScalarText> text = fields.text("title", "title: Rotations of the plane");
    if (text.isPresent() && text.get().value().strip().contains("\n")) {
      faults.add(text.get().place(), "the title has several lines", "put the rest under 'notes'");
    }
    return text.map(t -> t.value().strip());
  }

  private Map<String, List<BigFraction>> scan(ScalarSections scalars) {
    Map<String, List<BigFraction>> grids = new LinkedHashMap<>();
    Optional<YamlNode.Mapping> mapping = fields.mapping("scan", "scan: {a: [1/2, 1, 2]}");
    if (mapping.isEmpty()) {
      return Map.of();
    }
    Map<String, List<BigFraction>> found = new LinkedHashMap<>();
    for (YamlNode.Entry entry : Fields.distinct(mapping.get(), faults)) {
      faults.gather(
          () -> {
            checkScanned(entry, scalars);
            found.put(entry.name(), GridReader.read(entry, faults));
          });
    }
    for (String parameter : scalars.parameters()) {
      if (found.containsKey(parameter)) {
        grids.put(parameter, found.get(parameter));
      }
    }
    return Collections.unmodifiableMap(grids);
  }

  private void checkScanned(YamlNode.Entry entry, ScalarSections scalars) {
    if (scalars.open() || scalars.parameters().contains(entry.name())) {
      return;
    }
    Optional<String> meant = Spelling.meant(entry.name(), scalars.parameters());
    throw SpecFault.of(
        entry.key().place(),
        "'" + entry.name() + "' in 'scan' is not a parameter",
        meant
            .map(name -> "did you mean '" + name + "'?")
            .orElse("the parameters are " + String.join(", ", scalars.parameters())));
  }

  private static Map<String, Spec.Ground> grounds() {
    Map<String, Spec.Ground> words = new LinkedHashMap<>();
    words.put("real", Spec.Ground.REAL);
    words.put("complex", Spec.Ground.COMPLEX);
    return Collections.unmodifiableMap(words);
  }

  private static Map<String, Spec.Convention> conventions() {
    Map<String, Spec.Convention> words = new LinkedHashMap<>();
    words.put("direct", Spec.Convention.DIRECT);
    words.put("hermitian", Spec.Convention.HERMITIAN);
    return Collections.unmodifiableMap(words);
  }
}
