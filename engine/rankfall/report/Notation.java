package rankfall.report;

import java.util.ArrayList;
import java.util.Collection;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * How the names of one family are set: {@code g12} and {@code a_1} with a subscript, Greek letters
 * and their English names as Greek. Two names that would look alike are set as they are typed.
 */
final class Notation {
  private static final Pattern NAME = Pattern.compile("(\\p{L}+)([\\p{L}\\p{N}_]*)");

  private final Set<String> ambiguous;

  private Notation(Set<String> ambiguous) {
    this.ambiguous = Set.copyOf(ambiguous);
  }

  /** The notation for a family with these names. */
  static Notation of(Collection<String> names) {
    Map<Formula, String> seen = new HashMap<>();
    Set<String> ambiguous = new HashSet<>();
    for (String name : names) {
      String other = seen.putIfAbsent(set(name), name);
      if (other != null && !other.equals(name)) {
        ambiguous.add(name);
        ambiguous.add(other);
      }
    }
    return new Notation(ambiguous);
  }

  /** A name of a parameter, constant or generator, made of letters, digits and {@code _}. */
  Formula name(String name) {
    return ambiguous.contains(name) ? new Formula.Word(name) : set(name);
  }

  private static Formula set(String name) {
    Matcher m = NAME.matcher(name);
    if (!m.matches()) {
      return new Formula.Word(name);
    }
    Formula base = letters(m.group(1));
    List<Formula> below = new ArrayList<>();
    for (String part : m.group(2).split("_", -1)) {
      if (!part.isEmpty()) {
        below.add(
            part.chars().allMatch(Character::isDigit) ? new Formula.Number(part) : letters(part));
      }
    }
    return name.endsWith("_")
        ? new Formula.Word(name)
        : below.isEmpty() ? base : new Formula.Subscript(base, below);
  }

  private static Formula letters(String text) {
    Optional<Formula.Letter> greek = GreekLetters.named(text);
    if (greek.isPresent()) {
      return greek.get();
    }
    boolean single = text.length() == 1 && text.charAt(0) < 128;
    return single ? new Formula.Letter(text, text) : new Formula.Word(text);
  }
}
