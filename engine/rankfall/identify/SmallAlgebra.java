package rankfall.identify;

import java.util.ArrayList;
import java.util.List;
import rankfall.exact.Domain;
import rankfall.exact.Echelon;
import rankfall.exact.Elimination;
import rankfall.lie.AlgebraFacts;
import rankfall.lie.CharacteristicPolynomial;
import rankfall.lie.Ideals;
import rankfall.lie.LieBracket;
import rankfall.lie.Nilradical;
import rankfall.lie.Subspace;

/**
 * What an algebra of dimension 0 to 4 is, as far as no sign is needed.
 *
 * <p>The way: dimension 3 by the derived algebra D. If D has dimension 2 it is abelian and the
 * algebra is given by the matrix of an outer element on D, up to conjugation and a factor (Bianchi
 * 1898). A solvable algebra of dimension 4 has a nilradical N of dimension 2, 3 or 4 (Mubarakzyanov
 * 1963; Patera, Sharp, Winternitz and Zassenhaus 1976). If it is 3, the algebra is given by the
 * matrix A of an outer element on N, for N = R^3 up to conjugation and a factor, for N = h3 up to
 * inner derivations too: then A has the eigenvalues m, n of its action on N modulo the centre, and
 * m + n on the centre. If it is 2, g/N acts faithfully by commuting matrices none of which is
 * nilpotent, so they are the real diagonal ones, or the complex numbers.
 *
 * @param shape what decides the class, up to signs and parameters
 * @param dimension 0 to 4
 * @param data what signs and parameters depend on, see {@link Shape}; exact, not in normal form
 * @param assumed elements such that all of this is so wherever none of them vanishes
 * @param <E> the numbers
 */
record SmallAlgebra<E>(Shape shape, int dimension, List<E> data, List<E> assumed) {
  SmallAlgebra {
    data = List.copyOf(data);
    assumed = List.copyOf(assumed);
  }

  /**
   * Classes up to signs and parameters. Where the dimension is larger than that of the kind, the
   * rest is an abelian summand. The data of a matrix are the elementary symmetric functions of its
   * eigenvalues.
   */
  enum Shape {
    /** No brackets. */
    ABELIAN,
    /** [x, y] = y, and a centre. */
    AFFINE,
    /** [x, y] = z, and a centre. */
    HEISENBERG,
    /**
     * A simple algebra of dimension 3, and a centre; data: the polynomial of the Killing matrix.
     */
    SIMPLE,
    /** A multiple of 1 on the plane. */
    PLANE_SCALAR,
    /** A single block on the plane. */
    PLANE_BLOCK,
    /** Trace 0, invertible; data of the matrix on the plane. */
    PLANE_TRACELESS,
    /** Different eigenvalues, trace not 0, invertible; data of the matrix on the plane. */
    PLANE,
    /** The nilpotent one with [e2, e4] = e1, [e3, e4] = e2. */
    FILIFORM,
    /** Nilradical of dimension 2; data: the determinant of the Killing form modulo it. */
    PAIR,
    /** Eigenvalues 1, 0, 0 on R^3 with a block for 0. */
    SPACE_SINGULAR,
    /** A multiple of 1 on R^3. */
    SPACE_SCALAR,
    /** A triple eigenvalue on R^3, minimal polynomial of degree 2. */
    SPACE_TRIPLE,
    /** A single block on R^3. */
    SPACE_BLOCK,
    /** A double eigenvalue on R^3, diagonal; data of the matrix. */
    SPACE_DOUBLE,
    /** A double eigenvalue on R^3 with a block; data of the matrix. */
    SPACE_DOUBLE_BLOCK,
    /** Three different eigenvalues on R^3, invertible; data of the matrix. */
    SPACE,
    /** A multiple of 1 on h3 modulo its centre. */
    SYMPLECTIC_SCALAR,
    /** A single block on h3 modulo its centre. */
    SYMPLECTIC_BLOCK,
    /** Trace 0 on h3 modulo its centre, not nilpotent; data of the matrix there. */
    SYMPLECTIC_TRACELESS,
    /** Different eigenvalues on h3 modulo its centre, trace not 0; data of the matrix there. */
    SYMPLECTIC
  }

  /**
   * The class of an algebra.
   *
   * @param bracket of dimension 4 at most, over a ring of characteristic 0
   */
  static <E> SmallAlgebra<E> of(LieBracket<E> bracket) {
    int n = bracket.dimension();
    if (n > 4) {
      throw new IllegalArgumentException("dimension " + n);
    }
    return new Finder<>(bracket).find();
  }

  /** The numbers whose signs decide the class, beside the signature of the Killing form. */
  List<E> walls(Arithmetic<E> ring) {
    return switch (shape) {
      case PLANE, SYMPLECTIC -> List.of(discriminant(ring, data.get(0), data.get(1)));
      case PLANE_TRACELESS, SYMPLECTIC_TRACELESS -> List.of(data.get(1));
      case PAIR -> data;
      case SPACE -> List.of(discriminant(ring, data));
      default -> List.of();
    };
  }

  /** The discriminant of x^2 - t x + d. */
  private static <E> E discriminant(Arithmetic<E> ring, E t, E d) {
    return ring.minus(ring.square(t), ring.times(4, d));
  }

  /** The discriminant of x^3 - c1 x^2 + c2 x - c3. */
  private static <E> E discriminant(Arithmetic<E> ring, List<E> c) {
    E c1 = c.get(0);
    E c2 = c.get(1);
    E c3 = c.get(2);
    E c12 = ring.product(List.of(c1, c2));
    return ring.sum(
        List.of(
            ring.square(c12),
            ring.times(-4, ring.product(List.of(c2, c2, c2))),
            ring.times(-4, ring.product(List.of(c1, c1, c1, c3))),
            ring.times(18, ring.product(List.of(c12, c3))),
            ring.times(-27, ring.square(c3))));
  }

  private static final class Finder<E> {
    private final LieBracket<E> bracket;
    private final Domain<E> domain;
    private final Arithmetic<E> ring;
    private final int n;
    private final List<E> assumed = new ArrayList<>();

    Finder(LieBracket<E> bracket) {
      this.bracket = bracket;
      this.domain = bracket.domain();
      this.ring = new Arithmetic<>(domain);
      this.n = bracket.dimension();
    }

    private Subspace<E> assume(Subspace<E> s) {
      assumed.addAll(s.nonVanishing());
      return s;
    }

    private void assumeNonZero(E e) {
      E content = domain.normal(List.of(e)).content();
      if (domain.weight(content) > 0) {
        assumed.add(content);
      }
    }

    private SmallAlgebra<E> is(Shape shape, List<E> data) {
      return new SmallAlgebra<>(shape, n, data, assumed.stream().distinct().toList());
    }

    SmallAlgebra<E> find() {
      Subspace<E> d = assume(Ideals.derived(bracket));
      if (d.dimension() == 0) {
        return is(Shape.ABELIAN, List.of());
      }
      if (d.dimension() == 1) {
        Subspace<E> whole = Subspace.whole(domain, n);
        boolean central = assume(Ideals.bracket(bracket, whole, d)).dimension() == 0;
        return is(central ? Shape.HEISENBERG : Shape.AFFINE, List.of());
      }
      if (n == 3) {
        return d.dimension() == 3 ? simple() : onPlane(action(d), false);
      }
      Subspace<E> square = assume(Ideals.bracket(bracket, d, d));
      if (d.dimension() == 3) {
        return square.dimension() == 3 ? simple() : onNilradical(d, d);
      }
      Subspace<E> nilradical = assume(Nilradical.of(bracket, Subspace.whole(domain, n)));
      return switch (nilradical.dimension()) {
        case 4 -> is(Shape.FILIFORM, List.of());
        case 2 -> is(Shape.PAIR, List.of(pairing(nilradical)));
        default -> onNilradical(d, nilradical);
      };
    }

    private SmallAlgebra<E> simple() {
      return is(
          Shape.SIMPLE, CharacteristicPolynomial.of(domain, AlgebraFacts.of(bracket).killing()));
    }

    private IdealAction<E> action(Subspace<E> ideal) {
      IdealAction<E> a = IdealAction.of(bracket, ideal, Subspace.whole(domain, n));
      assumed.addAll(a.assumed());
      return a;
    }

    private boolean isZero(E e) {
      boolean zero = ring.vanishes(e);
      if (!zero) {
        assumeNonZero(e);
      }
      return zero;
    }

    private int minimalDegree(IdealAction<E> a) {
      Echelon<E> powers = a.powers();
      assumed.addAll(powers.nonVanishing());
      return powers.rank();
    }

    /** The plane is the image of the matrix; with a further kernel the data are those of it. */
    private SmallAlgebra<E> onPlane(IdealAction<E> a, boolean withKernel) {
      E t = a.symmetric().get(0);
      E d = a.symmetric().get(1);
      if (isZero(discriminant(ring, t, d))) {
        boolean block = minimalDegree(a) == (withKernel ? 3 : 2);
        return is(block ? Shape.PLANE_BLOCK : Shape.PLANE_SCALAR, List.of());
      }
      return is(isZero(t) ? Shape.PLANE_TRACELESS : Shape.PLANE, List.of(t, d));
    }

    /**
     * Solvable, not nilpotent; a derived algebra of dimension 3 is nilpotent, so the nilradical.
     */
    private SmallAlgebra<E> onNilradical(Subspace<E> derived, Subspace<E> nilradical) {
      Subspace<E> square = assume(Ideals.bracket(bracket, nilradical, nilradical));
      IdealAction<E> a = action(nilradical);
      if (square.dimension() > 0) {
        return onHeisenberg(a);
      }
      List<E> c = a.symmetric();
      if (derived.dimension() == 2) {
        return isZero(c.get(1)) ? is(Shape.SPACE_SINGULAR, List.of()) : onPlane(a, true);
      }
      return onSpace(a, c);
    }

    private SmallAlgebra<E> onSpace(IdealAction<E> a, List<E> c) {
      if (!isZero(discriminant(ring, c))) {
        return is(Shape.SPACE, c);
      }
      int degree = minimalDegree(a);
      E apart = ring.minus(ring.square(c.get(0)), ring.times(3, c.get(1)));
      if (isZero(apart)) {
        return is(
            switch (degree) {
              case 1 -> Shape.SPACE_SCALAR;
              case 2 -> Shape.SPACE_TRIPLE;
              default -> Shape.SPACE_BLOCK;
            },
            List.of());
      }
      return is(degree == 2 ? Shape.SPACE_DOUBLE : Shape.SPACE_DOUBLE_BLOCK, c);
    }

    /** Eigenvalues m, n, m + n; the data are those of twice the matrix modulo the centre. */
    private SmallAlgebra<E> onHeisenberg(IdealAction<E> a) {
      E t = a.symmetric().get(0);
      E d = ring.minus(ring.times(4, a.symmetric().get(1)), ring.square(t));
      if (isZero(discriminant(ring, t, d))) {
        boolean block = minimalDegree(a) == 3;
        return is(block ? Shape.SYMPLECTIC_BLOCK : Shape.SYMPLECTIC_SCALAR, List.of());
      }
      return is(isZero(t) ? Shape.SYMPLECTIC_TRACELESS : Shape.SYMPLECTIC, List.of(t, d));
    }

    /**
     * The determinant of the Killing form on a complement of the nilradical, which is its kernel.
     */
    private E pairing(Subspace<E> nilradical) {
      List<Integer> pivots = Elimination.of(domain, nilradical.basis(), n).pivots();
      List<Integer> rest = new ArrayList<>(List.of(0, 1, 2, 3));
      rest.removeAll(pivots);
      List<List<E>> k = AlgebraFacts.of(bracket).killing();
      int p = rest.get(0);
      int q = rest.get(1);
      return ring.minus(
          domain.times(k.get(p).get(p), k.get(q).get(q)), ring.square(k.get(p).get(q)));
    }
  }
}
