package rankfall.spec;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalInt;

/**
 * What may stand in an expression. The maps are shared with the caller and not changed here.
 *
 * @param setting where the expression stands, as in "an entry of Lx"
 * @param known the known names
 * @param later what those names will be that are given further down
 * @param vectors whether generators or matrices may stand in it
 * @param units the order of the matrix units that may stand in it
 * @param open whether unknown names are let through
 */
record Scope(
    String setting,
    Map<String, Role> known,
    Map<String, Role> later,
    boolean vectors,
    OptionalInt units,
    boolean open) {

  /** Numbers and the scalar names among those known. */
  static Scope ofScalars(String setting, Map<String, Role> known, boolean open) {
    return new Scope(setting, known, Map.of(), false, OptionalInt.empty(), open);
  }

  /** Any names at all. */
  static Scope ofAnyName(String setting) {
    return new Scope(setting, Map.of(), Map.of(), false, OptionalInt.empty(), true);
  }

  Scope withLater(Map<String, Role> names) {
    return new Scope(setting, known, names, vectors, units, open);
  }

  Scope withSetting(String words) {
    return new Scope(words, known, later, vectors, units, open);
  }

  Scope withGenerators() {
    return new Scope(setting, known, later, true, OptionalInt.empty(), open);
  }

  Scope withMatrices(int order) {
    return new Scope(setting, known, later, true, OptionalInt.of(order), open);
  }

  boolean isParameter(String name) {
    return known.get(name) == Role.PARAMETER;
  }

  /** Whether the name is a generator, a matrix, or an unknown name where generators may stand. */
  boolean isVector(String name) {
    Role role = known.get(name);
    return role == null ? vectors && !name.equals("i") : !role.isScalar();
  }

  /**
   * Lets a name pass.
   *
   * @throws SpecFault if it is not known or may not stand here
   */
  void check(String name, Place place) {
    Role role = known.get(name);
    if (name.equals("i") || (role == null && open)) {
      return;
    }
    if (role == null) {
      throw unknown(name, place);
    }
    if (!role.isScalar() && !vectors) {
      throw SpecFault.of(
          place,
          "'" + name + "' is " + role.phrase() + " and cannot stand in " + setting,
          "numbers, parameters, constants and abbreviations can");
    }
  }

  SpecFault unknown(String name, Place place) {
    if (later.containsKey(name)) {
      return SpecFault.of(
          place,
          "'" + name + "' in " + setting + " is not given before it",
          "only earlier ones can be used");
    }
    List<String> allowed =
        known.entrySet().stream()
            .filter(e -> vectors || e.getValue().isScalar())
            .map(Map.Entry::getKey)
            .toList();
    String cause = "unknown name '" + name + "' in " + setting;
    Optional<String> meant = Spelling.meant(name, allowed);
    if (meant.isPresent()) {
      return SpecFault.of(place, cause, "did you mean '" + meant.get() + "'?");
    }
    String advice =
        Spelling.nearest(name, allowed)
            .map(
                near ->
                    "the nearest known name is '"
                        + near
                        + "'; a new one is listed under 'parameters'")
            .orElse("list it under 'parameters'");
    return SpecFault.of(place, cause, advice);
  }
}
