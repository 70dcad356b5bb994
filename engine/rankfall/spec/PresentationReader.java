package rankfall.spec;

import java.util.ArrayList;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** Reads matrices or brackets, with the keys that go with them. */
final class PresentationReader {
  /** The most generators of a family. */
  static final int MAX_GENERATORS = 512;

  private static final Map<String, Spec.Closure> CLOSURES = closures();

  private final Fields fields;
  private final Names names;
  private final Place start;
  private final Faults faults;
  private final boolean open;
  private final List<String> listed = new ArrayList<>();

  PresentationReader(Fields fields, Names names, boolean open, Place start, Faults faults) {
    this.fields = fields;
    this.names = names;
    this.open = open;
    this.start = start;
    this.faults = faults;
  }

  private static Map<String, Spec.Closure> closures() {
    Map<String, Spec.Closure> words = new LinkedHashMap<>();
    words.put("require", Spec.Closure.REQUIRE);
    words.put("generate", Spec.Closure.GENERATE);
    return Collections.unmodifiableMap(words);
  }

  /** Declares the names under {@code generators}. */
  void declareListed() {
    if (fields.has("matrices")) {
      return;
    }
    fields
        .list("generators", "generators: [X, Y, Z]")
        .ifPresent(
            list ->
                list.items()
                    .forEach(
                        item ->
                            faults.gather(
                                () -> {
                                  ScalarText text = Scalars.text(item, "the name of a generator");
                                  names.declare(text.value(), Role.GENERATOR, text.place());
                                  listed.add(text.value());
                                })));
  }

  /** The presentation; empty where there is none, or not one alone, or no generator. */
  Optional<Spec.Presentation> read() {
    boolean matrices = fields.has("matrices");
    boolean brackets = fields.has("brackets");
    if (matrices && brackets) {
      faults.add(
          fields
              .entry("brackets")
              .or(() -> fields.entry("matrices"))
              .map(e -> e.key().place())
              .orElse(start),
          "both 'matrices' and 'brackets' stand here",
          "give one of them");
      return Optional.empty();
    }
    if (matrices) {
      misplaced("generators", "brackets");
      return matrices();
    }
    if (brackets) {
      misplaced("order", "matrices");
      misplaced("closure", "matrices");
      return brackets();
    }
    faults.add(start, "neither 'matrices' nor 'brackets' stands in the spec", "give one of them");
    return Optional.empty();
  }

  private void misplaced(String key, String partner) {
    fields
        .entry(key)
        .ifPresent(
            entry ->
                faults.add(
                    entry.key().place(),
                    "'" + key + "' goes with '" + partner + "' only",
                    "leave it out"));
  }

  private Optional<Spec.Presentation> matrices() {
    Optional<YamlNode.Mapping> mapping =
        fields.mapping("matrices", "matrices: {X: [[0, 1], [-1, 0]]}");
    Spec.Closure closure = fields.choice("closure", CLOSURES);
    MatrixReader.Order order = order();
    if (mapping.isEmpty()) {
      return Optional.empty();
    }
    List<YamlNode.Entry> entries = Fields.distinct(mapping.get(), faults);
    if (entries.isEmpty()) {
      faults.add(mapping.get().place(), "no matrix is given", "write at least one");
      return Optional.empty();
    }
    if (tooMany(
        entries.size(), entries.get(Math.min(entries.size() - 1, MAX_GENERATORS)).key().place())) {
      return Optional.empty();
    }
    return Optional.of(new MatrixReader(entries, names, open, faults).read(order, closure));
  }

  private MatrixReader.Order order() {
    Optional<ScalarText> text = fields.text("order", "order: 3");
    if (text.isEmpty()) {
      return fields.has("order") ? MatrixReader.Order.faulty() : MatrixReader.Order.unwritten();
    }
    try {
      return MatrixReader.Order.written(
          Scalars.integer(text.get(), "order", 1, MatrixReader.MAX_ORDER));
    } catch (SpecFault fault) {
      faults.add(fault);
      return MatrixReader.Order.faulty();
    }
  }

  private Optional<Spec.Presentation> brackets() {
    Optional<YamlNode.Entry> entry = fields.entry("brackets");
    if (entry.isEmpty()) {
      return Optional.empty();
    }
    boolean list = fields.has("generators");
    List<Spec.BracketEquation> equations = List.of();
    if (!entry.get().isNull()) {
      Optional<ScalarText> text =
          fields.text("brackets", "'brackets: |' with equations [X, Y] = a*Z on the lines below");
      if (text.isEmpty()) {
        return Optional.empty();
      }
      boolean lenient = open || fields.isBroken("generators");
      equations = new BracketReader(text.get(), names, list, lenient, faults).read();
    }
    List<String> generators =
        list
            ? List.copyOf(listed)
            : names.roles().entrySet().stream()
                .filter(e -> e.getValue() == Role.GENERATOR)
                .map(Map.Entry::getKey)
                .toList();
    if (tooMany(generators.size(), entry.get().key().place())) {
      return Optional.empty();
    }
    if (generators.isEmpty() && faults.none()) {
      faults.add(
          entry.get().key().place(), "there is no generator", "list them under 'generators'");
      return Optional.empty();
    }
    return Optional.of(new Spec.Brackets(generators, equations));
  }

  private boolean tooMany(int count, Place place) {
    if (count > MAX_GENERATORS) {
      faults.add(
          place,
          "the family has " + count + " generators",
          "at most " + MAX_GENERATORS + " are read");
      return true;
    }
    return false;
  }
}
