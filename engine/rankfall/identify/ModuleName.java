package rankfall.identify;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import rankfall.identify.ModuleParts.Isotypic;
import rankfall.identify.SimpleIdeal.Kind;
import rankfall.identify.SimpleType.Series;

/**
 * The name of a semisimple algebra that acts faithfully on a module, with the name of the module.
 *
 * <p>{@code R^d} is an irreducible module that stays irreducible over the complex numbers, {@code
 * C^d} one whose endomorphisms are the complex numbers, {@code H^d} one whose endomorphisms are the
 * quaternions; under {@code so(3)} the latter is {@code R^(4d)}. A name is given only if it says
 * which module it is, up to automorphisms of the algebra: all modules of the dimension are images
 * of one under the diagram automorphism, and at most one summand is changed by it (for, say, R^3 +
 * R^3 under sl(3,R) may be a module and its dual).
 *
 * @param algebra names of the algebra, the preferred first
 * @param summands names of the summands of the module, by dimension
 * @param kind over which numbers the module is irreducible, if it is
 */
record ModuleName(List<String> algebra, List<String> summands, Shape kind) {
  /** Whether a module is irreducible, and its endomorphisms. */
  enum Shape {
    /** Irreducible, real numbers. */
    REAL,
    /** Irreducible, complex numbers. */
    COMPLEX,
    /** Irreducible, quaternions. */
    QUATERNIONIC,
    /** A sum. */
    SUM
  }

  ModuleName {
    algebra = List.copyOf(algebra);
    summands = List.copyOf(summands);
  }

  /** An irreducible module over the complex numbers with its multiplicity, and what it is real. */
  private record Term(String name, int dimension, int copies, Shape shape, int chiral) {}

  /**
   * Names a module.
   *
   * @param ideals the ideals over the field; each acts on some part
   * @param parts of the module, the algebra has no invariants in it
   * @return empty where the name would not tell the module
   */
  static <E> Optional<ModuleName> of(List<SimpleIdeals.Part<E>> ideals, ModuleParts parts) {
    if (ideals.size() == 1) {
      return one(ideals.get(0).ideals(), parts.parts());
    }
    List<SimpleIdeal> all = ideals.stream().flatMap(p -> p.ideals().stream()).toList();
    return all.size() == ideals.size() && parts.parts().size() == 1
        ? vectorsOfFour(all, parts.parts().get(0))
        : Optional.empty();
  }

  /** Two ideals of dimension 3 on the tensor product of their modules of dimension 2. */
  private static Optional<ModuleName> vectorsOfFour(List<SimpleIdeal> ideals, Isotypic part) {
    boolean plane =
        ideals.size() == 2
            && ideals.stream().allMatch(i -> i.kind() != Kind.COMPLEX_AS_REAL && isA1(i))
            && part.labels().stream().allMatch(l -> l.equals(List.of(List.of(List.of(1)))));
    if (!plane) {
      return Optional.empty();
    }
    TypeName sum = SumName.of(ideals);
    int copies = part.dimension() / 4;
    if (ideals.get(0).kind() == Kind.COMPLEX) {
      return Optional.of(named(sum, List.of(new Term("C^4", 4, copies, Shape.COMPLEX, 0))));
    }
    boolean mixed = !ideals.get(0).character().equals(ideals.get(1).character());
    Term term =
        mixed
            ? new Term("H^2", 8, copies / 2, Shape.QUATERNIONIC, 0)
            : new Term("R^4", 4, copies, Shape.REAL, 0);
    return Optional.of(
        named(
            mixed ? new TypeName("so*(4)", List.of("(" + sum.name() + ")")) : sum, List.of(term)));
  }

  private static boolean isA1(SimpleIdeal ideal) {
    return ideal.type().equals(Optional.of(new SimpleType(Series.A, 1)));
  }

  private static Optional<ModuleName> one(List<SimpleIdeal> ideals, List<Isotypic> parts) {
    if (ideals.size() > 1) {
      return Optional.empty();
    }
    SimpleIdeal ideal = ideals.get(0);
    Optional<RealForm> form = SumName.form(ideal);
    if (ideal.kind() != Kind.COMPLEX && form.isEmpty()) {
      return Optional.empty();
    }
    Weights weights = Weights.of(ideal.type().orElseThrow());
    List<Term> terms = new ArrayList<>();
    for (Isotypic part : parts) {
      Optional<Term> term =
          switch (ideal.kind()) {
            case REAL -> real(form.get(), weights, part);
            case COMPLEX_AS_REAL -> complexAsReal(weights, part);
            case COMPLEX -> complex(weights, part);
          };
      if (term.isEmpty()) {
        return Optional.empty();
      }
      terms.add(term.get());
    }
    if (terms.stream().mapToInt(Term::chiral).sum() > 1) {
      return Optional.empty();
    }
    terms.sort(Comparator.comparingInt(Term::dimension));
    return Optional.of(named(names(ideal, weights.type(), terms), terms));
  }

  private static ModuleName named(TypeName algebra, List<Term> terms) {
    List<String> names = new ArrayList<>(List.of(algebra.name()));
    names.addAll(algebra.otherNames());
    List<String> summands = new ArrayList<>();
    terms.forEach(t -> IntStream.range(0, t.copies).forEach(k -> summands.add(t.name)));
    return new ModuleName(names, summands, summands.size() == 1 ? terms.get(0).shape : Shape.SUM);
  }

  /**
   * The weight of all modules of one dimension that the label allows, if they are one up to the
   * diagram automorphism and no other module has that dimension.
   */
  private static Optional<List<Integer>> only(
      Weights weights, List<List<Integer>> allowed, int dimension) {
    List<Integer> first = allowed.get(0);
    boolean known =
        weights.upTo(dimension).stream()
            .filter(w -> weights.dimension(w) == dimension)
            .allMatch(w -> w.equals(first) || w.equals(weights.mirrored(first)));
    boolean one =
        allowed.stream().allMatch(w -> w.equals(first) || w.equals(weights.mirrored(first)));
    return known && one ? Optional.of(first) : Optional.empty();
  }

  private static boolean isMoved(Weights weights, List<Integer> weight) {
    return !weights.mirrored(weight).equals(weight);
  }

  private static List<List<Integer>> simple(Isotypic part) {
    return part.labels().get(0).stream().map(tuple -> tuple.get(0)).toList();
  }

  private static Optional<Term> complex(Weights weights, Isotypic part) {
    List<List<Integer>> allowed = simple(part);
    int d = weights.dimension(allowed.get(0));
    int copies = part.dimension() / d;
    return only(weights, allowed, d)
        .map(w -> new Term("C^" + d, d, copies, Shape.COMPLEX, isMoved(weights, w) ? copies : 0));
  }

  private static Optional<Term> real(RealForm form, Weights weights, Isotypic part) {
    List<List<Integer>> allowed = simple(part);
    int d = weights.dimension(allowed.get(0));
    int n = weights.type().rank();
    int copies = part.dimension() / d;
    if (isVectorOfEight(weights, allowed) && copies == 1) {
      return Optional.of(new Term("R^8", 8, 1, Shape.REAL, 1));
    }
    Optional<List<Integer>> weight = only(weights, allowed, d);
    if (weight.isEmpty()) {
      return Optional.empty();
    }
    boolean moved = isMoved(weights, weight.get());
    boolean first = weights.type().series() != Series.D && d == least(weights.type());
    boolean vector =
        (weights.type().series() == Series.B && d == 2 * n + 1)
            || (weights.type().series() == Series.D && n > 4 && d == 2 * n);
    Shape shape = Shape.SUM;
    if (copies == 1 || form.split() || vector) {
      shape = Shape.REAL;
    } else if (n == 1) {
      shape = d % 2 == 1 ? Shape.REAL : Shape.QUATERNIONIC;
    } else if (first && isUnitary(form)) {
      shape = Shape.COMPLEX;
    } else if (first && isQuaternionic(form)) {
      shape = Shape.QUATERNIONIC;
    }
    int half = copies / 2;
    return switch (shape) {
      case REAL -> Optional.of(new Term("R^" + d, d, copies, shape, moved ? copies : 0));
      case COMPLEX -> Optional.of(new Term("C^" + d, 2 * d, half, shape, 0));
      case QUATERNIONIC ->
          Optional.of(
              new Term(n == 1 ? "R^" + 2 * d : "H^" + d / 2, 2 * d, half, shape, moved ? half : 0));
      case SUM -> Optional.empty();
    };
  }

  /** The three modules of dimension 8 of D_4; the real ones are images of one (triality). */
  private static boolean isVectorOfEight(Weights weights, List<List<Integer>> allowed) {
    return weights.type().equals(new SimpleType(Series.D, 4))
        && allowed.stream().allMatch(w -> weights.dimension(w) == 8);
  }

  /** The dimension of the defining module of matrices, for A, B_2 (as sp(4)) and C. */
  private static int least(SimpleType type) {
    return switch (type.series()) {
      case A -> type.rank() + 1;
      case B -> type.rank() == 2 ? 4 : -1;
      case C -> 2 * type.rank();
      default -> -1;
    };
  }

  private static boolean isUnitary(RealForm form) {
    return names(form).anyMatch(s -> s.matches("su\\(.*"));
  }

  private static boolean isQuaternionic(RealForm form) {
    return names(form).anyMatch(s -> s.matches("su\\*.*|sp\\(\\d+(,\\d+)?\\)"));
  }

  private static java.util.stream.Stream<String> names(RealForm form) {
    return java.util.stream.Stream.concat(
        java.util.stream.Stream.of(form.name()), form.otherNames().stream());
  }

  private static Optional<Term> complexAsReal(Weights weights, Isotypic part) {
    List<List<List<Integer>>> allowed = part.labels().get(0);
    List<Integer> trivial = java.util.Collections.nCopies(weights.type().rank(), 0);
    if (allowed.stream().allMatch(pair -> pair.contains(trivial))) {
      List<List<Integer>> others =
          allowed.stream()
              .map(pair -> pair.get(0).equals(trivial) ? pair.get(1) : pair.get(0))
              .distinct()
              .toList();
      int d = weights.dimension(others.get(0));
      int copies = part.dimension() / (2 * d);
      return only(weights, others, d)
          .map(
              w ->
                  new Term(
                      "C^" + d, 2 * d, copies, Shape.COMPLEX, isMoved(weights, w) ? copies : 0));
    }
    List<List<List<Integer>>> distinct = allowed.stream().distinct().toList();
    boolean square = distinct.size() == 1 && distinct.get(0).get(0).equals(distinct.get(0).get(1));
    if (!square || weights.type().rank() > 1) {
      return Optional.empty();
    }
    int d = weights.dimension(distinct.get(0).get(0));
    return Optional.of(new Term("R^" + d * d, d * d, part.dimension() / (d * d), Shape.REAL, 0));
  }

  /** The names of the algebra, first the one under which it has the module. */
  private static TypeName names(SimpleIdeal ideal, SimpleType type, List<Term> terms) {
    TypeName all = SumName.one(ideal);
    Term least = terms.get(0);
    String prefix = "";
    if (ideal.kind() == Kind.COMPLEX_AS_REAL && type.rank() == 1) {
      prefix = least.shape == Shape.COMPLEX ? "sl(2,C)_R" : "so(3,1)";
    } else if (type.equals(new SimpleType(Series.B, 2))) {
      prefix = least.name.endsWith("5") ? "so(" : "sp(";
    } else if (type.equals(new SimpleType(Series.A, 3))) {
      prefix = least.name.endsWith("6") ? "so(" : "s[lu]";
    }
    List<String> names = new ArrayList<>(List.of(all.name()));
    names.addAll(all.otherNames());
    String wanted = prefix;
    names.sort(
        Comparator.comparing(
            s -> !s.matches(wanted.replace("(", "\\(").replace(")", "\\)") + ".*")));
    return new TypeName(names.get(0), names.subList(1, names.size()));
  }

  /** The module, in parentheses if it is a sum. */
  String module() {
    return summands.size() == 1 ? summands.get(0) : "(" + String.join(" + ", summands) + ")";
  }

  /** The semidirect sum of the algebra and the module as abelian ideal. */
  TypeName semidirect() {
    List<String> others = new ArrayList<>();
    for (String a : algebra.subList(1, algebra.size())) {
      others.add(factor(a) + " |x " + module());
    }
    String only = summands.get(0);
    if (kind == Shape.COMPLEX || (kind == Shape.QUATERNIONIC && only.startsWith("H"))) {
      String real = "R^" + dimension(only) * (kind == Shape.COMPLEX ? 2 : 4);
      algebra.forEach(
          a -> others.add(factor(a) + " |x " + real + " (" + real + " = " + only + ")"));
    }
    if (kind == Shape.REAL) {
      algebra.stream()
          .filter(a -> a.matches("so\\([0-9,]+\\)") && order(a) == dimension(summands.get(0)))
          .forEach(a -> others.add("i" + a));
    }
    return new TypeName(factor(algebra.get(0)) + " |x " + module(), others);
  }

  /**
   * The semidirect sum of the algebra, one more element that commutes with it, and the module.
   *
   * <p>On an irreducible module with real endomorphisms the element is a number. With complex ones,
   * or quaternions and so(3), a trace of 0 makes it a multiple of the imaginary unit.
   *
   * @param traceless whether all elements act with trace 0
   * @param line the name of an abelian algebra of dimension 1
   * @return empty where this does not tell the algebra
   */
  Optional<TypeName> withCentre(boolean traceless, String line) {
    if (kind == Shape.SUM) {
      return Optional.empty();
    }
    List<String> out = new ArrayList<>();
    if (kind == Shape.REAL || line.equals("C")) {
      algebra.stream()
          .filter(a -> a.matches("sl\\(\\d+,[RC]\\)") && order(a) == dimension(module()))
          .forEach(a -> out.add("g" + a.substring(1) + " |x " + module()));
      algebra.forEach(a -> out.add("(" + a + " + " + line + ") |x " + module()));
    } else if (traceless) {
      algebra.stream()
          .filter(a -> a.matches("su\\([0-9,]+\\)"))
          .filter(a -> kind == Shape.COMPLEX || (order(a) == 2 && module().equals("R^4")))
          .forEach(a -> out.add(a.substring(1) + " |x C^" + order(a)));
    }
    return out.isEmpty()
        ? Optional.empty()
        : Optional.of(new TypeName(out.get(0), out.subList(1, out.size())));
  }

  /** Whether it is a symplectic algebra on the module of its matrices. */
  boolean isDefiningOfSymplectic(int order) {
    String field = summands.get(0).substring(0, 1);
    return summands.get(0).equals(field + "^" + order)
        && algebra.contains("sp(" + order + "," + field + ")");
  }

  private static String factor(String name) {
    return name.contains(" ") && !name.startsWith("(") ? "(" + name + ")" : name;
  }

  private static int dimension(String power) {
    return Integer.parseInt(power.substring(power.indexOf('^') + 1));
  }

  /** p + q of so(p,q). */
  private static int order(String so) {
    return java.util.Arrays.stream(so.replaceAll("[^0-9,]", "").split(","))
        .map(BigInteger::new)
        .reduce(BigInteger.ZERO, BigInteger::add)
        .intValueExact();
  }
}
