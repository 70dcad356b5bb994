package rankfall.locus;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import rankfall.spec.Expression;
import rankfall.spec.Spec;

/**
 * The profile at one point modulo a prime, from the spec by the definitions alone: the second, slow
 * path beside the strata. Only real families that need no algebraic numbers.
 *
 * @param spec the family
 * @param field the integers modulo a prime
 */
record PlainProfile(Spec spec, Residues field) {
  PlainProfile {
    if (spec.ground() != Spec.Ground.REAL || spec.convention() != Spec.Convention.DIRECT) {
      throw new IllegalArgumentException(spec.family() + " is not a plain real family");
    }
  }

  /**
   * The profile at a point.
   *
   * @param point values of the parameters, in their order
   * @return empty where a relation fails, an entry has a pole, the span is not closed or Jacobi's
   *     identity fails
   */
  Optional<Profile> at(List<Long> point) {
    try {
      Map<String, Long> scalars = new HashMap<>();
      for (int i = 0; i < point.size(); i++) {
        scalars.put(spec.parameters().get(i), point.get(i));
      }
      for (Spec.Abbreviation a : spec.abbreviations()) {
        scalars.put(a.name(), plain(scalars).of(a.value())[0]);
      }
      return spec.where().stream().allMatch(c -> holds(c, scalars))
          ? constants(scalars).filter(this::jacobi).map(this::profile)
          : Optional.empty();
    } catch (ResidueExpression.Pole e) {
      return Optional.empty();
    }
  }

  private ResidueExpression plain(Map<String, Long> scalars) {
    return vectors(scalars, new HashMap<>(), 0, 1);
  }

  private ResidueExpression vectors(
      Map<String, Long> scalars, Map<String, long[]> vectors, int order, int width) {
    scalars.forEach(
        (name, v) -> {
          long[] x = new long[width];
          x[0] = v;
          vectors.put(name, x);
        });
    return new ResidueExpression(field, vectors, order, width);
  }

  private boolean holds(Spec.Condition c, Map<String, Long> scalars) {
    boolean equal = plain(scalars).of(c.left())[0] == plain(scalars).of(c.right())[0];
    return switch (c.relation()) {
      case EQUAL -> equal;
      case UNEQUAL -> !equal;
      default -> throw new ResidueExpression.NotRational("an order: " + c.text());
    };
  }

  private Optional<long[][][]> constants(Map<String, Long> scalars) {
    return spec.presentation() instanceof Spec.Matrices m
        ? fromMatrices(m, scalars)
        : Optional.of(fromTable((Spec.Brackets) spec.presentation(), scalars));
  }

  private long[][][] fromTable(Spec.Brackets table, Map<String, Long> scalars) {
    int n = table.generators().size();
    Map<String, long[]> names = new HashMap<>();
    for (int k = 0; k < n; k++) {
      long[] x = new long[n + 1];
      x[k + 1] = 1;
      names.put(table.generators().get(k), x);
    }
    ResidueExpression values = vectors(scalars, names, 0, n + 1);
    long[][][] c = new long[n][n][n];
    for (Spec.BracketEquation e : table.equations()) {
      int i = table.generators().indexOf(e.left());
      int j = table.generators().indexOf(e.right());
      long[] v = values.of(e.value());
      for (int k = 0; k < n; k++) {
        c[i][j][k] = v[k + 1];
        c[j][i][k] = (field.prime() - v[k + 1]) % field.prime();
      }
    }
    return c;
  }

  private Optional<long[][][]> fromMatrices(Spec.Matrices m, Map<String, Long> scalars) {
    if (m.closure() != Spec.Closure.REQUIRE) {
      throw new IllegalArgumentException(spec.family() + " generates");
    }
    Map<String, long[]> known = new HashMap<>();
    Residues.Rows span = new Residues.Rows(field);
    List<long[]> basis = new ArrayList<>();
    for (Spec.NamedMatrix x : m.matrices()) {
      long[] v =
          entries(
              x.body(), m.order(), vectors(scalars, known, m.order(), 1 + m.order() * m.order()));
      known.put(x.name(), v);
      if (span.add(v, m.matrices().size())) {
        basis.add(v);
      }
    }
    int n = basis.size();
    long[][][] c = new long[n][n][n];
    for (int i = 0; i < n; i++) {
      for (int j = 0; j < n; j++) {
        Optional<long[]> x = span.coordinates(commutator(basis.get(i), basis.get(j), m.order()));
        if (x.isEmpty()) {
          return Optional.empty();
        }
        c[i][j] = x.get();
      }
    }
    return Optional.of(c);
  }

  private static long[] entries(Spec.MatrixBody body, int order, ResidueExpression values) {
    if (body instanceof Spec.Combination x) {
      return values.of(x.value());
    }
    long[] out = new long[1 + order * order];
    int at = 1;
    for (List<Expression> row : ((Spec.Rows) body).entries()) {
      for (Expression e : row) {
        out[at++] = values.of(e)[0];
      }
    }
    return out;
  }

  private long[] commutator(long[] a, long[] b, int order) {
    long[] out = new long[a.length];
    for (int i = 0; i < order; i++) {
      for (int j = 0; j < order; j++) {
        long sum = 0;
        for (int k = 0; k < order; k++) {
          sum += a[1 + i * order + k] * b[1 + k * order + j] % field.prime();
          sum -= b[1 + i * order + k] * a[1 + k * order + j] % field.prime();
        }
        out[1 + i * order + j] = Math.floorMod(sum, field.prime());
      }
    }
    return out;
  }

  private boolean jacobi(long[][][] c) {
    int n = c.length;
    for (int i = 0; i < n; i++) {
      for (int j = i + 1; j < n; j++) {
        for (int k = j + 1; k < n; k++) {
          for (int t = 0; t < n; t++) {
            long sum = 0;
            for (int l = 0; l < n; l++) {
              sum += c[i][j][l] * c[l][k][t] % field.prime();
              sum += c[j][k][l] * c[l][i][t] % field.prime();
              sum += c[k][i][l] * c[l][j][t] % field.prime();
            }
            if (sum % field.prime() != 0) {
              return false;
            }
          }
        }
      }
    }
    return true;
  }

  private Profile profile(long[][][] c) {
    int n = c.length;
    List<long[]> killing = new ArrayList<>();
    List<long[]> derived = new ArrayList<>();
    List<long[]> central = new ArrayList<>();
    for (int i = 0; i < n; i++) {
      long[] form = new long[n];
      long[] action = new long[n * n];
      for (int j = 0; j < n; j++) {
        derived.add(c[i][j]);
        System.arraycopy(c[i][j], 0, action, j * n, n);
        for (int k = 0; k < n; k++) {
          for (int l = 0; l < n; l++) {
            form[j] = (form[j] + c[i][k][l] * c[j][l][k]) % field.prime();
          }
        }
      }
      killing.add(form);
      central.add(action);
    }
    return new Profile(n, field.rank(killing), field.rank(derived), n - field.rank(central));
  }
}
