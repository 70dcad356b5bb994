package rankfall.spec;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.apache.commons.numbers.fraction.BigFraction;

/** Reads the sections of scalars: parameters, constants, abbreviations, and what they satisfy. */
final class ScalarSections {
  private static final List<String> CONSTANT_KEYS = List.of("minimal", "near");
  private static final String CONSTANT_EXAMPLE = "{minimal: \"x^3 - x - 1\", near: 1.3247}";

  private final Fields fields;
  private final Names names;
  private final Faults faults;
  private final List<String> parameters = new ArrayList<>();
  private final List<Spec.Constant> constants = new ArrayList<>();
  private final List<Spec.Abbreviation> abbreviations = new ArrayList<>();
  private final Optional<YamlNode.Mapping> abbreviationEntries;
  private final boolean open;

  /** Declares and reads parameters and constants. */
  ScalarSections(Fields fields, Names names, Faults faults) {
    this.fields = fields;
    this.names = names;
    this.faults = faults;
    Optional<YamlNode.Sequence> listed = fields.list("parameters", "parameters: [a, b]");
    Optional<YamlNode.Mapping> numbers =
        fields.mapping("constants", "constants: {w: " + CONSTANT_EXAMPLE + "}");
    abbreviationEntries = fields.mapping("abbreviations", "abbreviations: {D: \"a*b\"}");
    open =
        fields.isBroken("parameters")
            || fields.isBroken("constants")
            || fields.isBroken("abbreviations");
    listed.ifPresent(list -> list.items().forEach(item -> faults.gather(() -> parameter(item))));
    numbers.ifPresent(
        m -> Fields.distinct(m, faults).forEach(entry -> faults.gather(() -> constant(entry))));
  }

  /** Whether a list of names could not be read, so that unknown names say nothing. */
  boolean open() {
    return open;
  }

  List<String> parameters() {
    return List.copyOf(parameters);
  }

  List<Spec.Constant> constants() {
    return List.copyOf(constants);
  }

  List<Spec.Abbreviation> abbreviations() {
    return List.copyOf(abbreviations);
  }

  private void parameter(YamlNode item) {
    ScalarText text = Scalars.text(item, "the name of a parameter");
    names.declare(text.value(), Role.PARAMETER, text.place());
    parameters.add(text.value());
  }

  private void constant(YamlNode.Entry entry) {
    faults.gather(() -> names.declare(entry.name(), Role.CONSTANT, entry.key().place()));
    if (!(entry.value() instanceof YamlNode.Mapping mapping)) {
      throw SpecFault.of(
          entry.valuePlace(),
          "the constant '" + entry.name() + "' has no minimal polynomial",
          "write " + CONSTANT_EXAMPLE);
    }
    Fields parts = Fields.of(mapping, CONSTANT_KEYS, faults);
    for (String key : CONSTANT_KEYS) {
      if (!parts.has(key)) {
        throw SpecFault.of(
            entry.key().place(),
            "the constant '" + entry.name() + "' has no '" + key + "'",
            "write " + CONSTANT_EXAMPLE);
      }
    }
    Optional<ScalarText> minimal = parts.text("minimal", "minimal: \"x^3 - x - 1\"");
    Optional<YamlNode.Entry> near = parts.entry("near");
    if (minimal.isPresent() && near.isPresent()) {
      BigFraction[] number = new BigFraction[1];
      faults.gather(() -> number[0] = Scalars.number(near.get().value(), "'near'"));
      Scope scope = Scope.ofAnyName("the minimal polynomial of " + entry.name());
      List<BigFraction> coefficients =
          UnivariatePolynomial.coefficients(ExpressionReader.read(minimal.get(), scope));
      if (number[0] != null) {
        constants.add(
            new Spec.Constant(entry.name(), coefficients, number[0], entry.key().place()));
      }
    }
  }

  /** Declares and reads the abbreviations, each with the names before it. */
  void readAbbreviations() {
    if (abbreviationEntries.isEmpty()) {
      return;
    }
    List<YamlNode.Entry> entries = Fields.distinct(abbreviationEntries.get(), faults);
    Map<String, Role> later = new LinkedHashMap<>();
    entries.forEach(entry -> later.put(entry.name(), Role.ABBREVIATION));
    for (YamlNode.Entry entry : entries) {
      faults.gather(
          () -> {
            ScalarText text =
                entry.isNull()
                    ? missing(entry)
                    : Scalars.text(entry.value(), "an expression such as \"a*b - 1\"");
            Scope scope =
                Scope.ofScalars("the abbreviation " + entry.name(), names.roles(), open)
                    .withLater(later);
            Expression value = ExpressionReader.read(text, scope);
            abbreviations.add(new Spec.Abbreviation(entry.name(), value, entry.key().place()));
          });
      faults.gather(() -> names.declare(entry.name(), Role.ABBREVIATION, entry.key().place()));
      later.remove(entry.name());
    }
  }

  private static ScalarText missing(YamlNode.Entry entry) {
    throw SpecFault.of(
        entry.key().place(),
        "the abbreviation '" + entry.name() + "' has no value",
        "write an expression such as \"a*b - 1\"");
  }

  /** The conditions, read with all names known. */
  List<Spec.Condition> where(Spec.Ground ground) {
    List<Spec.Condition> conditions = new ArrayList<>();
    Scope scope = Scope.ofScalars("a condition", names.roles(), open);
    fields
        .list("where", "where: [\"b > 0\", \"a != b\"]")
        .ifPresent(
            list ->
                list.items()
                    .forEach(
                        item ->
                            faults.gather(
                                () ->
                                    conditions.add(
                                        ConditionReader.read(
                                            Scalars.text(item, "a condition such as b > 0"),
                                            scope,
                                            ground)))));
    return List.copyOf(conditions);
  }
}
