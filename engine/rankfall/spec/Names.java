package rankfall.spec;

import java.lang.Character.UnicodeScript;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;

/** The names that a document gives, each once. */
final class Names {
  private record Given(Role role, int line) {}

  private final boolean matrixUnits;
  private final Map<String, Given> given = new LinkedHashMap<>();

  /**
   * No names yet.
   *
   * @param matrixUnits whether {@code E} stands for matrix units, so that no name may be E
   */
  Names(boolean matrixUnits) {
    this.matrixUnits = matrixUnits;
  }

  static boolean startsName(int c) {
    if (!Character.isLetter(c)) {
      return false;
    }
    UnicodeScript script = UnicodeScript.of(c);
    return script == UnicodeScript.LATIN || script == UnicodeScript.GREEK;
  }

  static boolean continuesName(int c) {
    return startsName(c) || c == '_' || (c >= '0' && c <= '9');
  }

  static boolean isName(String text) {
    return !text.isEmpty()
        && startsName(text.codePointAt(0))
        && text.codePoints().allMatch(Names::continuesName);
  }

  /** The function of that name, written in small letters. */
  static Optional<Expression.FunctionKind> function(String name) {
    for (Expression.FunctionKind kind : Expression.FunctionKind.values()) {
      if (kind.name().toLowerCase(Locale.ROOT).equals(name)) {
        return Optional.of(kind);
      }
    }
    return Optional.empty();
  }

  static List<String> functionNames() {
    return List.of("sqrt", "cos", "sin", "tan", "exp", "cosh", "sinh", "tanh");
  }

  /**
   * Gives a name its role.
   *
   * @throws SpecFault if it is no name, is reserved or is used already; in the last case it keeps
   *     its first role
   */
  void declare(String name, Role role, Place place) {
    if (!isName(name)) {
      throw SpecFault.of(
          place,
          "'" + name + "' cannot be " + role.phrase(),
          "a name begins with a Latin or Greek letter and goes on with letters, digits and _");
    }
    Optional<String> reserved = reservedFor(name);
    if (reserved.isPresent()) {
      throw SpecFault.of(
          place,
          "the name '" + name + "' is reserved for " + reserved.get(),
          "choose another name");
    }
    Given first = given.putIfAbsent(name, new Given(role, place.line()));
    if (first != null) {
      throw SpecFault.of(
          place,
          "the name '" + name + "' is used twice",
          "in line " + first.line() + " it is " + first.role().phrase() + " already");
    }
  }

  private Optional<String> reservedFor(String name) {
    if (name.equals("i")) {
      return Optional.of("the imaginary unit");
    }
    if (name.equals("E") && matrixUnits) {
      return Optional.of("matrix units");
    }
    return functionNames().contains(name) ? Optional.of("a function") : Optional.empty();
  }

  Optional<Role> role(String name) {
    return Optional.ofNullable(given.get(name)).map(Given::role);
  }

  /** The names given so far with their roles, in the order they were given. */
  Map<String, Role> roles() {
    Map<String, Role> roles = new LinkedHashMap<>();
    given.forEach((name, g) -> roles.put(name, g.role()));
    return Collections.unmodifiableMap(roles);
  }
}
