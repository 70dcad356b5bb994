package rankfall.spec;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;

/** Reads {@code brackets}: one equation {@code [X, Y] = a*Z} a line, with {@code #} comments. */
final class BracketReader {
  private static final String EXAMPLE = "write equations such as [X, Y] = a*Z, one a line";

  /** An equation and the scope its right side was read in. */
  private record Line(Spec.BracketEquation equation, Scope scope) {}

  private final ScalarText text;
  private final Names names;
  private final boolean listed;
  private final boolean open;
  private final Faults faults;
  private final Scope anyBracket;
  private final Map<String, Place> pairNames = new LinkedHashMap<>();
  private final Map<String, Place> inOrder = new LinkedHashMap<>();

  /**
   * Prepares the reading.
   *
   * @param names all names so far, among them the generators where they are listed
   * @param listed whether {@code generators} lists them
   * @param open whether unknown names are let through, because their list could not be read
   */
  BracketReader(ScalarText text, Names names, boolean listed, boolean open, Faults faults) {
    this.text = text;
    this.names = names;
    this.listed = listed;
    this.open = open;
    this.faults = faults;
    anyBracket = Scope.ofScalars("a bracket", names.roles(), open || !listed).withGenerators();
  }

  /**
   * Reads all equations; where generators are not listed, those found are declared in the order in
   * which they appear.
   */
  List<Spec.BracketEquation> read() {
    List<Line> lines = new ArrayList<>();
    int from = 0;
    for (int at = 0; at <= text.size(); at++) {
      if (at == text.size() || text.at(at) == '\n') {
        int start = from;
        int end = contentEnd(from, at);
        faults.gather(() -> line(start, end).ifPresent(lines::add));
        from = at + 1;
      }
    }
    List<Spec.BracketEquation> kept = new ArrayList<>();
    for (Line line : lines) {
      faults.gather(() -> check(line).ifPresent(kept::add));
    }
    if (!listed) {
      inOrder.forEach(
          (name, place) -> faults.gather(() -> names.declare(name, Role.GENERATOR, place)));
    }
    return List.copyOf(kept);
  }

  private int contentEnd(int from, int to) {
    for (int k = from; k < to; k++) {
      if (text.at(k) == '#') {
        return k;
      }
    }
    return to;
  }

  private Optional<Line> line(int from, int to) {
    List<Token> tokens = Tokenizer.tokens(text, from, to);
    if (tokens.size() == 1) {
      return Optional.empty();
    }
    int[] shape = {0, 2, 4, 5};
    String[] signs = {"[", ",", "]", "="};
    for (int k = 0; k < shape.length; k++) {
      expect(tokens, shape[k], signs[k]);
    }
    String left = generator(tokens.get(1));
    String right = generator(tokens.get(3));
    Scope scope = scope(left, right);
    List<Token> rest = tokens.subList(6, tokens.size());
    for (Token token : rest) {
      if (token.is("[")) {
        throw SpecFault.of(
            text.place(token.from(), token.to()),
            "a second bracket in one equation",
            "write one equation a line");
      }
    }
    Expression value = ExpressionReader.read(text, rest, scope);
    for (Expression.Name name : NameNodes.of(value)) {
      if (scope.isVector(name.name())) {
        inOrder.putIfAbsent(name.name(), name.place());
      }
    }
    Place place = text.place(from + leading(from, to), rest.get(rest.size() - 2).to());
    return Optional.of(new Line(new Spec.BracketEquation(left, right, value, place), scope));
  }

  private int leading(int from, int to) {
    int k = from;
    while (k < to && Character.isWhitespace(text.at(k))) {
      k++;
    }
    return k - from;
  }

  private void expect(List<Token> tokens, int index, String sign) {
    Token token = tokens.get(Math.min(index, tokens.size() - 1));
    if (!token.is(sign)) {
      String found =
          token.kind() == Token.Kind.END ? "the line ends" : "'" + token.text() + "' stands";
      throw SpecFault.of(
          text.place(token.from(), token.to()), found + " where '" + sign + "' is due", EXAMPLE);
    }
  }

  private String generator(Token token) {
    Place place = text.place(token.from(), token.to());
    if (token.kind() != Token.Kind.NAME) {
      throw SpecFault.of(place, "'" + token.text() + "' is not a generator", EXAMPLE);
    }
    Optional<Role> role = names.role(token.text());
    if (role.isPresent() && role.get() != Role.GENERATOR) {
      throw SpecFault.of(
          place,
          "'" + token.text() + "' in a bracket is " + role.get().phrase() + ", not a generator",
          "a bracket holds two generators");
    }
    if (role.isEmpty() && listed && !open) {
      throw unlisted(token.text(), place);
    }
    pairNames.putIfAbsent(token.text(), place);
    inOrder.putIfAbsent(token.text(), place);
    return token.text();
  }

  private SpecFault unlisted(String name, Place place) {
    List<String> generators =
        names.roles().entrySet().stream()
            .filter(e -> e.getValue() == Role.GENERATOR)
            .map(Map.Entry::getKey)
            .toList();
    return SpecFault.of(
        place,
        "'" + name + "' is not among the generators",
        Spelling.meant(name, generators)
            .map(near -> "did you mean '" + near + "'?")
            .orElse("add it to 'generators'"));
  }

  private Scope scope(String left, String right) {
    return anyBracket.withSetting("the bracket of " + left + " and " + right);
  }

  /** Checks the right side; an equation that says nothing is left out. */
  private Optional<Spec.BracketEquation> check(Line line) {
    Spec.BracketEquation equation = line.equation();
    Linearity.Kind kind = open ? Linearity.Kind.VECTOR : linearity(line);
    if (!equation.left().equals(equation.right())) {
      return Optional.of(equation);
    }
    if (kind != Linearity.Kind.ZERO) {
      throw SpecFault.of(
          equation.place(),
          "the bracket of " + equation.left() + " with itself is 0",
          "take two different generators, or leave the line out");
    }
    return Optional.empty();
  }

  private Linearity.Kind linearity(Line line) {
    try {
      return Linearity.check(line.equation().value(), line.scope(), "generators");
    } catch (SpecFault fault) {
      throw misspelt(line).orElse(fault);
    }
  }

  /** A name in no pair that is multiplied with a generator was meant to be a scalar. */
  private Optional<SpecFault> misspelt(Line line) {
    if (listed) {
      return Optional.empty();
    }
    Map<String, Role> known = new LinkedHashMap<>(names.roles());
    pairNames.keySet().forEach(name -> known.putIfAbsent(name, Role.GENERATOR));
    Scope scope = Scope.ofScalars(line.scope().setting(), known, false).withGenerators();
    Set<Expression.Name> strange = new LinkedHashSet<>();
    for (Expression.Name name : NameNodes.of(line.equation().value())) {
      if (!name.name().equals("i") && !known.containsKey(name.name())) {
        strange.add(name);
      }
    }
    return strange.stream()
        .filter(name -> Spelling.meant(name.name(), known.keySet()).isPresent())
        .findFirst()
        .or(() -> strange.stream().findFirst())
        .map(name -> scope.unknown(name.name(), name.place()));
  }
}
