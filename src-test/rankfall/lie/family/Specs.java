package rankfall.lie.family;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.SortedMap;
import java.util.TreeMap;
import org.apache.commons.numbers.fraction.BigFraction;
import rankfall.spec.Expression;
import rankfall.spec.Place;
import rankfall.spec.Spec;

/** Builds specs for tests out of short texts, without the reader of files. */
final class Specs {
  private Spec.Ground ground = Spec.Ground.REAL;
  private Spec.Convention convention = Spec.Convention.DIRECT;
  private Spec.Closure closure = Spec.Closure.REQUIRE;
  private List<String> parameters = List.of();
  private final List<Spec.Condition> where = new ArrayList<>();
  private final List<Spec.Constant> constants = new ArrayList<>();
  private final List<Spec.Abbreviation> abbreviations = new ArrayList<>();
  private final List<Spec.NamedMatrix> matrices = new ArrayList<>();
  private final List<Spec.BracketEquation> brackets = new ArrayList<>();
  private final Set<String> generators = new LinkedHashSet<>();
  private int order;
  private int line;

  static Specs real(String... parameters) {
    Specs s = new Specs();
    s.parameters = List.of(parameters);
    return s;
  }

  static Specs complex(String... parameters) {
    Specs s = real(parameters);
    s.ground = Spec.Ground.COMPLEX;
    return s;
  }

  Specs hermitian() {
    convention = Spec.Convention.HERMITIAN;
    return this;
  }

  Specs generate() {
    closure = Spec.Closure.GENERATE;
    return this;
  }

  Specs where(String left, Spec.Relation relation, String right) {
    Place place = place();
    where.add(
        new Spec.Condition(
            read(left), relation, read(right), left + " " + relation + " " + right, place));
    return this;
  }

  /** Coefficients with the constant term first. */
  Specs constant(String name, double near, long... coefficients) {
    constants.add(
        new Spec.Constant(
            name,
            Arrays.stream(coefficients)
                .mapToObj(c -> BigFraction.of(BigInteger.valueOf(c)))
                .toList(),
            BigFraction.from(near),
            place()));
    return this;
  }

  Specs abbreviation(String name, String value) {
    abbreviations.add(new Spec.Abbreviation(name, read(value), place()));
    return this;
  }

  /** Rows separated by {@code ;}, entries by {@code ,}. */
  Specs matrix(String name, String rows) {
    Place place = place();
    List<List<Expression>> entries =
        Arrays.stream(rows.split(";"))
            .map(r -> Arrays.stream(r.split(",")).map(this::read).toList())
            .toList();
    order = entries.size();
    matrices.add(new Spec.NamedMatrix(name, new Spec.Rows(entries), place));
    return this;
  }

  Specs combination(int order, String name, String value) {
    this.order = order;
    matrices.add(new Spec.NamedMatrix(name, new Spec.Combination(read(value)), place()));
    return this;
  }

  Specs bracket(String left, String right, String value) {
    generators.add(left);
    generators.add(right);
    brackets.add(new Spec.BracketEquation(left, right, read(value), place()));
    return this;
  }

  Specs generators(String... names) {
    generators.addAll(List.of(names));
    return this;
  }

  Spec build() {
    Spec.Presentation presentation =
        brackets.isEmpty() && generators.isEmpty()
            ? new Spec.Matrices(order, closure, matrices)
            : new Spec.Brackets(List.copyOf(generators), brackets);
    List<String> lines = new ArrayList<>();
    for (int k = 0; k <= line; k++) {
      lines.add("line " + (k + 1));
    }
    return new Spec(
        "demo",
        Optional.empty(),
        Optional.empty(),
        ground,
        convention,
        parameters,
        where,
        constants,
        abbreviations,
        presentation,
        List.of(),
        Map.of(),
        Map.of(),
        new Spec.Source("demo.yaml", lines, "", new Place("demo.yaml", 1, 1, 1), List.of()));
  }

  private Place place() {
    line++;
    return new Place("demo.yaml", line, 1, 1);
  }

  private Expression read(String text) {
    return new Reader(text.replace(" ", ""), place()).all();
  }

  static Map<String, BigFraction> point(String... pairs) {
    Map<String, BigFraction> out = new LinkedHashMap<>();
    for (String p : pairs) {
      String[] side = p.split("=");
      String[] q = side[1].split("/");
      out.put(
          side[0],
          BigFraction.of(
              new BigInteger(q[0]), q.length > 1 ? new BigInteger(q[1]) : BigInteger.ONE));
    }
    return out;
  }

  /** Recursive descent over one line. */
  private static final class Reader {
    private final String text;
    private final Place place;
    private int at;

    Reader(String text, Place place) {
      this.text = text;
      this.place = place;
    }

    Expression all() {
      Expression e = sum();
      if (at != text.length()) {
        throw new IllegalArgumentException("cannot read " + text + " at " + at);
      }
      return e;
    }

    private boolean take(String c) {
      if (text.startsWith(c, at)) {
        at += c.length();
        return true;
      }
      return false;
    }

    private Expression sum() {
      Expression e = product();
      while (true) {
        if (take("+")) {
          e = new Expression.Binary(Expression.Operator.PLUS, e, product(), place);
        } else if (take("-")) {
          e = new Expression.Binary(Expression.Operator.MINUS, e, product(), place);
        } else {
          return e;
        }
      }
    }

    private Expression product() {
      Expression e = signed();
      while (true) {
        if (take("*")) {
          e = new Expression.Binary(Expression.Operator.TIMES, e, signed(), place);
        } else if (take("/")) {
          e = new Expression.Binary(Expression.Operator.OVER, e, signed(), place);
        } else {
          return e;
        }
      }
    }

    private Expression signed() {
      return take("-") ? new Expression.Negation(signed(), place) : power();
    }

    private Expression power() {
      Expression e = atom();
      return take("^") ? new Expression.Power(e, (take("-") ? -1 : 1) * integer(), place) : e;
    }

    private int integer() {
      int from = at;
      while (at < text.length() && Character.isDigit(text.charAt(at))) {
        at++;
      }
      return Integer.parseInt(text.substring(from, at));
    }

    private Expression atom() {
      if (take("(")) {
        Expression e = sum();
        close();
        return e;
      }
      if (Character.isDigit(text.charAt(at))) {
        return new Expression.Number(BigFraction.of(integer()), place);
      }
      int from = at;
      while (at < text.length() && Character.isLetterOrDigit(text.charAt(at))) {
        at++;
      }
      String name = text.substring(from, at);
      return take("(") ? called(name) : new Expression.Name(name, place);
    }

    private void close() {
      if (!take(")")) {
        throw new IllegalArgumentException("no ) in " + text + " at " + at);
      }
    }

    private Expression called(String name) {
      if (name.equals("E")) {
        int row = integer();
        at++;
        int column = integer();
        close();
        return new Expression.MatrixUnit(row, column, place);
      }
      int from = at;
      at = text.indexOf(')', at);
      String inside = text.substring(from, at);
      close();
      if (name.equals("sqrt")) {
        String[] q = inside.split("/");
        return new Expression.Root(
            BigFraction.of(Integer.parseInt(q[0]), q.length > 1 ? Integer.parseInt(q[1]) : 1),
            place);
      }
      SortedMap<String, BigInteger> argument = new TreeMap<>();
      for (String part : inside.replace("-", "+-").split("\\+")) {
        if (!part.isEmpty()) {
          String[] factors = part.split("\\*");
          String p = factors[factors.length - 1];
          BigInteger k = factors.length > 1 ? new BigInteger(factors[0]) : BigInteger.ONE;
          argument.put(p.replace("-", ""), p.startsWith("-") ? k.negate() : k);
        }
      }
      return new Expression.Function(
          Expression.FunctionKind.valueOf(name.toUpperCase(java.util.Locale.ROOT)),
          argument,
          place);
    }
  }
}
