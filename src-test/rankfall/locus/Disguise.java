package rankfall.locus;

import java.util.ArrayList;
import java.util.Collections;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Random;
import java.util.stream.Collectors;
import rankfall.spec.Expression;
import rankfall.spec.Spec;

/**
 * The same family written otherwise: another basis by a unimodular matrix of integers, which
 * shuffles the generators too, and parameters with other names in another order.
 *
 * @param yaml the spec
 * @param parameters the new names of the parameters, by old name
 */
record Disguise(String yaml, Map<String, String> parameters) {

  static Disguise of(Spec spec, Random random) {
    List<String> names = new ArrayList<>(spec.parameters());
    Collections.shuffle(names, random);
    Map<String, String> renamed = new HashMap<>();
    List<String> order = new ArrayList<>();
    for (String name : names) {
      String other = "w" + (order.size() + 1) + (random.nextBoolean() ? "_" : "x");
      renamed.put(name, other);
      order.add(other);
    }
    int n = spec.presentation().generators().size();
    Unimodular u = Unimodular.random(n, random);
    String body =
        spec.presentation() instanceof Spec.Matrices m
            ? matrices(m, u, renamed)
            : brackets((Spec.Brackets) spec.presentation(), u, renamed);
    String where =
        spec.where().stream()
            .map(c -> "  - \"" + condition(c, renamed) + "\"\n")
            .collect(Collectors.joining());
    return new Disguise(
        "family: disguised\nparameters: "
            + order
            + "\n"
            + (where.isEmpty() ? "" : "where:\n" + where)
            + body,
        renamed);
  }

  private static String condition(Spec.Condition c, Map<String, String> renamed) {
    ExpressionSource source = new ExpressionSource(renamed);
    String sign =
        switch (c.relation()) {
          case EQUAL -> " = ";
          case UNEQUAL -> " != ";
          default -> throw new IllegalArgumentException("an order: " + c.text());
        };
    return source.of(c.left()) + sign + source.of(c.right());
  }

  private static String matrices(Spec.Matrices m, Unimodular u, Map<String, String> renamed) {
    StringBuilder out = new StringBuilder("order: " + m.order() + "\nmatrices:\n");
    for (int a = 0; a < u.rows().length; a++) {
      List<String> terms = new ArrayList<>();
      for (int i = 0; i < u.rows().length; i++) {
        if (u.rows()[a][i] != 0) {
          terms.add("(" + u.rows()[a][i] + ")*" + body(m.matrices().get(i), renamed));
        }
      }
      out.append("  G")
          .append(a + 1)
          .append(": \"")
          .append(String.join(" + ", terms))
          .append("\"\n");
    }
    return out.toString();
  }

  private static String body(Spec.NamedMatrix x, Map<String, String> renamed) {
    ExpressionSource source = new ExpressionSource(renamed);
    if (x.body() instanceof Spec.Combination c) {
      return source.of(c.value());
    }
    List<String> terms = new ArrayList<>();
    List<List<Expression>> rows = ((Spec.Rows) x.body()).entries();
    for (int r = 0; r < rows.size(); r++) {
      for (int c = 0; c < rows.size(); c++) {
        terms.add(source.of(rows.get(r).get(c)) + "*E(" + (r + 1) + "," + (c + 1) + ")");
      }
    }
    return "(" + String.join(" + ", terms) + ")";
  }

  private static String brackets(Spec.Brackets table, Unimodular u, Map<String, String> renamed) {
    int n = table.generators().size();
    Map<String, String> names = new HashMap<>(renamed);
    for (int k = 0; k < n; k++) {
      List<String> terms = new ArrayList<>();
      for (int a = 0; a < n; a++) {
        if (u.inverse()[k][a] != 0) {
          terms.add("(" + u.inverse()[k][a] + ")*G" + (a + 1));
        }
      }
      names.put(table.generators().get(k), "(" + String.join(" + ", terms) + ")");
    }
    ExpressionSource source = new ExpressionSource(names);
    StringBuilder out = new StringBuilder("generators: [");
    for (int a = 0; a < n; a++) {
      out.append(a == 0 ? "G" : ", G").append(a + 1);
    }
    out.append("]\nbrackets: |\n");
    for (int a = 0; a < n; a++) {
      for (int b = a + 1; b < n; b++) {
        List<String> terms = new ArrayList<>();
        for (Spec.BracketEquation e : table.equations()) {
          int i = table.generators().indexOf(e.left());
          int j = table.generators().indexOf(e.right());
          long c = u.rows()[a][i] * u.rows()[b][j] - u.rows()[a][j] * u.rows()[b][i];
          if (c != 0) {
            terms.add("(" + c + ")*" + source.of(e.value()));
          }
        }
        String right = terms.isEmpty() ? "0" : String.join(" + ", terms);
        out.append("  [G" + (a + 1) + ", G" + (b + 1) + "] = " + right + "\n");
      }
    }
    return out.toString();
  }

  /**
   * A matrix of integers with determinant 1 or -1.
   *
   * @param rows the matrix
   * @param inverse its inverse
   */
  private record Unimodular(long[][] rows, long[][] inverse) {
    /** A permutation, then elementary steps; both matrices follow. */
    static Unimodular random(int n, Random random) {
      List<Integer> order = new ArrayList<>();
      for (int i = 0; i < n; i++) {
        order.add(i);
      }
      Collections.shuffle(order, random);
      long[][] u = new long[n][n];
      long[][] v = new long[n][n];
      for (int i = 0; i < n; i++) {
        u[i][order.get(i)] = 1;
        v[order.get(i)][i] = 1;
      }
      for (int step = 0; step < n && n > 1; step++) {
        int a = random.nextInt(n);
        int b = (a + 1 + random.nextInt(n - 1)) % n;
        long c = random.nextBoolean() ? 1 : -1;
        for (int k = 0; k < n; k++) {
          u[a][k] += c * u[b][k];
          v[k][b] -= c * v[k][a];
        }
      }
      return new Unimodular(u, v);
    }
  }
}
