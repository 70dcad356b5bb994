package rankfall.scan;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.IntStream;
import org.apache.commons.numbers.fraction.BigFraction;
import rankfall.exact.Polynomial;
import rankfall.exact.Rationals;
import rankfall.exact.Term;
import rankfall.exact.Variables;

/**
 * The signs of some polynomials at rational points, compiled for the order in which the points
 * come. All signs are exact.
 *
 * <p>Denominators are cleared first, which changes no sign: on a lattice the coordinates are
 * numerators over fixed denominators, elsewhere a value n/d has the two coordinates n and d. What
 * is left are polynomials in integers; each is evaluated in longs where no overflow can happen
 * ({@code LongForm}), else in doubles with a proved bound and big integers behind it ({@code
 * DoubleForm}). One thread at a time.
 */
final class SignProgram implements Signs {
  private static final BigInteger LONGS = BigInteger.ONE.shiftLeft(63);

  private final List<SignForm> forms;
  private final Coordinates at;
  private final int values;
  private final int inner;

  private SignProgram(List<SignForm> forms, Coordinates at, int values, int inner) {
    this.forms = List.copyOf(forms);
    this.at = at;
    this.values = values;
    this.inner = inner;
  }

  /**
   * A program for the points of a lattice, line by line.
   *
   * @param frame says what the variables of the polynomials are
   * @param polynomials in one ring
   * @param lattice whose names are those of the frame
   */
  static SignProgram along(Frame frame, List<Polynomial> polynomials, Lattice lattice) {
    int n = lattice.names().size();
    int inner = lattice.lineLength() > 1 ? lattice.inner() : -1;
    List<SignForm> forms = new ArrayList<>();
    int[] degrees = new int[n];
    for (Polynomial p : polynomials) {
      NumberPolynomial q = integral(frame, p, t -> onLattice(t, lattice.denominators()));
      boolean fits = q.isRational() && q.rational().bound(lattice.reaches()).compareTo(LONGS) < 0;
      forms.add(
          fits
              ? new LongForm(laidOut(q.rational(), inner))
              : form(frame, q, inner, inner < 0 ? 0 : lattice.reaches().get(inner)));
      raise(degrees, q);
    }
    return new SignProgram(forms, new Coordinates(degrees), n, inner);
  }

  /**
   * A program for single points.
   *
   * @param frame says what the variables of the polynomials are
   * @param polynomials in one ring
   */
  static SignProgram anywhere(Frame frame, List<Polynomial> polynomials) {
    int n = frame.names().size();
    List<SignForm> forms = new ArrayList<>();
    int[] degrees = new int[2 * n];
    for (Polynomial p : polynomials) {
      NumberPolynomial q = integral(frame, p, SignProgram::homogeneous);
      forms.add(form(frame, q, -1, 0));
      raise(degrees, q);
    }
    return new SignProgram(forms, new Coordinates(degrees), n, -1);
  }

  private static SignForm form(Frame frame, NumberPolynomial q, int inner, long reach) {
    if (q.isRational()) {
      List<Monomials> along = laidOut(q.rational(), inner);
      return new DoubleForm(along, q.degree(), reach, new BigForm(along));
    }
    SignForm exact = new NumberForm(q, inner, frame.numbers());
    Optional<List<Monomials>> along = q.rounded(inner, frame.numbers());
    return along.isEmpty() ? exact : new DoubleForm(along.get(), q.degree(), reach, exact);
  }

  private static List<Monomials> laidOut(IntegerPolynomial p, int inner) {
    return p.along(inner).stream().map(Monomials::new).toList();
  }

  private static void raise(int[] degrees, NumberPolynomial q) {
    for (int v = 0; v < degrees.length; v++) {
      degrees[v] = Math.max(Math.max(1, degrees[v]), q.degree(v));
    }
  }

  /** A term in the values of a point, over the greatest degree of each value. */
  private record Pure(BigInteger coefficient, int[] exponents, int[] degrees) {}

  /** Clears the denominators of one term. */
  private interface Clearing {
    IntegerPolynomial.Term cleared(Pure term);
  }

  private static IntegerPolynomial.Term onLattice(Pure t, List<Long> denominators) {
    BigInteger c = t.coefficient;
    for (int v = 0; v < t.exponents.length; v++) {
      c = c.multiply(BigInteger.valueOf(denominators.get(v)).pow(t.degrees[v] - t.exponents[v]));
    }
    return new IntegerPolynomial.Term(c, t.exponents);
  }

  private static IntegerPolynomial.Term homogeneous(Pure t) {
    int n = t.exponents.length;
    int[] e = Arrays.copyOf(t.exponents, 2 * n);
    for (int v = 0; v < n; v++) {
      e[n + v] = t.degrees[v] - t.exponents[v];
    }
    return new IntegerPolynomial.Term(t.coefficient, e);
  }

  /** A polynomial free of denominators. */
  private static NumberPolynomial integral(Frame frame, Polynomial p, Clearing clearing) {
    Variables ring = p.variables();
    int n = frame.names().size();
    int[] place = frame.places(ring);
    int[] degrees = new int[n];
    for (int v = 0; v < place.length; v++) {
      if (place[v] >= 0) {
        degrees[place[v]] = p.degree(v);
      }
    }
    Map<List<Integer>, Map<List<Integer>, BigInteger>> sums = new LinkedHashMap<>();
    for (Term t : p.terms()) {
      int[] e = new int[n];
      List<Integer> numbers = new ArrayList<>();
      boolean zero = false;
      for (int v = 0; v < ring.count(); v++) {
        int k = t.exponents().get(v);
        boolean number = v >= ring.indeterminates();
        numbers.add(number ? k : 0);
        if (place[v] >= 0) {
          e[place[v]] = k;
        } else if (!number && k > 0) {
          zero |= frame.isZero(ring.names().get(v));
        }
      }
      if (!zero) {
        sums.computeIfAbsent(numbers, m -> new LinkedHashMap<>())
            .merge(Arrays.stream(e).boxed().toList(), t.coefficient(), BigInteger::add);
      }
    }
    Map<List<Integer>, IntegerPolynomial> out = new LinkedHashMap<>();
    sums.forEach(
        (numbers, terms) -> {
          List<IntegerPolynomial.Term> part =
              terms.entrySet().stream()
                  .filter(t -> t.getValue().signum() != 0)
                  .map(t -> new Pure(t.getValue(), ints(t.getKey()), degrees))
                  .map(clearing::cleared)
                  .toList();
          if (!part.isEmpty()) {
            out.put(numbers, new IntegerPolynomial(part));
          }
        });
    return new NumberPolynomial(ring, out);
  }

  private static int[] ints(List<Integer> list) {
    return list.stream().mapToInt(Integer::intValue).toArray();
  }

  /**
   * Goes to a line.
   *
   * @param numerators of any of its points
   */
  void enter(long[] numerators) {
    at.nextLine();
    for (int v = 0; v < values; v++) {
      if (v != inner) {
        at.set(v, numerators[v]);
      }
    }
  }

  /** Goes to a point of the line. */
  void move(long innerNumerator) {
    at.setInner(innerNumerator);
  }

  /** Goes to any point; for programs made {@link #anywhere}. */
  void enter(List<BigFraction> point) {
    at.nextLine();
    for (int v = 0; v < values; v++) {
      at.set(v, Rationals.numerator(point.get(v)));
      at.set(values + v, Rationals.denominator(point.get(v)));
    }
  }

  @Override
  public int sign(int polynomial) {
    return forms.get(polynomial).sign(at);
  }

  /** How many polynomials are evaluated in longs. */
  long inLongs() {
    return IntStream.range(0, forms.size()).filter(k -> forms.get(k) instanceof LongForm).count();
  }
}
