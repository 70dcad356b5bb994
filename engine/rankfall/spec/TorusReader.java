package rankfall.spec;

import java.util.ArrayList;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** Reads {@code torus} and {@code covectors}. */
final class TorusReader {
  private final Fields fields;
  private final Names names;
  private final boolean open;
  private final Faults faults;
  private final List<String> generators;
  private final List<Place> places = new ArrayList<>();

  /** Prepares the reading; the generators are declared already. */
  TorusReader(Fields fields, Names names, boolean open, Faults faults) {
    this.fields = fields;
    this.names = names;
    this.open = open;
    this.faults = faults;
    generators =
        names.roles().entrySet().stream()
            .filter(e -> !e.getValue().isScalar())
            .map(Map.Entry::getKey)
            .toList();
  }

  List<String> torus() {
    List<String> torus = new ArrayList<>();
    fields
        .list("torus", "torus: [X, Y]")
        .ifPresent(
            list ->
                list.items().forEach(item -> faults.gather(() -> torus.add(member(item, torus)))));
    return List.copyOf(torus);
  }

  /** Where the elements stand that {@link #torus} read. */
  List<Place> places() {
    return List.copyOf(places);
  }

  private String member(YamlNode item, List<String> before) {
    ScalarText text = Scalars.text(item, "the name of a generator");
    String name = text.value();
    if (!generators.isEmpty() && !generators.contains(name)) {
      throw unknown(name, text.place(), "torus", generators);
    }
    if (before.contains(name)) {
      throw SpecFault.of(text.place(), "'" + name + "' stands twice in 'torus'", "remove one");
    }
    places.add(text.place());
    return name;
  }

  private static SpecFault unknown(String name, Place place, String key, List<String> known) {
    return SpecFault.of(
        place,
        "'"
            + name
            + "' in '"
            + key
            + "' is not "
            + (key.equals("torus") ? "a generator" : "in the torus"),
        Spelling.meant(name, known)
            .map(near -> "did you mean '" + near + "'?")
            .orElse("the names are " + String.join(", ", known)));
  }

  Map<String, Map<String, Expression>> covectors(List<String> torus) {
    Map<String, Map<String, Expression>> covectors = new LinkedHashMap<>();
    Optional<YamlNode.Mapping> mapping =
        fields.mapping("covectors", "covectors: {k: {X: 2}} with X of the torus");
    if (mapping.isEmpty()) {
      return Map.of();
    }
    if (!fields.has("torus")) {
      faults.add(
          fields.entry("covectors").map(e -> e.key().place()).orElse(mapping.get().place()),
          "'covectors' without 'torus'",
          "list commuting generators under 'torus'");
      return Map.of();
    }
    for (YamlNode.Entry entry : Fields.distinct(mapping.get(), faults)) {
      faults.gather(() -> covectors.put(name(entry), components(entry, torus)));
    }
    return Collections.unmodifiableMap(covectors);
  }

  private static String name(YamlNode.Entry entry) {
    if (!Names.isName(entry.name())) {
      throw SpecFault.of(
          entry.key().place(),
          "'" + entry.name() + "' cannot be a covector",
          "a name begins with a Latin or Greek letter and goes on with letters, digits and _");
    }
    return entry.name();
  }

  private Map<String, Expression> components(YamlNode.Entry entry, List<String> torus) {
    if (!(entry.value() instanceof YamlNode.Mapping mapping)) {
      throw SpecFault.of(
          entry.valuePlace(),
          "the covector '" + entry.name() + "' has no components",
          "write its value on elements of the torus, as in {X: 2}");
    }
    Map<String, Expression> components = new LinkedHashMap<>();
    Scope scope = Scope.ofScalars("the covector " + entry.name(), names.roles(), open);
    for (YamlNode.Entry part : Fields.distinct(mapping, faults)) {
      faults.gather(
          () -> {
            if (!torus.contains(part.name()) && !torus.isEmpty()) {
              throw unknown(part.name(), part.key().place(), "covectors", torus);
            }
            ScalarText text = Scalars.text(part.value(), "a number or an expression");
            components.put(part.name(), ExpressionReader.read(text, scope));
          });
    }
    return Collections.unmodifiableMap(components);
  }
}
