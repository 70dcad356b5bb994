package rankfall.published;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.SortedMap;
import java.util.TreeSet;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.apache.commons.numbers.fraction.BigFraction;
import rankfall.exact.Chain;
import rankfall.exact.GroebnerBasis;
import rankfall.exact.Polynomial;
import rankfall.exact.Variables;
import rankfall.published.PublishedEntry.Stratum;
import rankfall.published.Quantity.Root;

/**
 * Compares closed sets of points of one family, given by equations: two lists of equations are as
 * good as each other if each equation of one has a power in the ideal of the other (Hilbert's
 * theorem of zeros).
 *
 * @param numbers the algebraic numbers of the family
 * @param relations polynomials that vanish at every point of the family
 */
record PublishedSets(List<Root> numbers, List<String> relations) {
  private static final Pattern NAME =
      Pattern.compile("\\p{L}[\\p{L}\\d_]*(\\([^()]*\\))?", Pattern.UNICODE_CHARACTER_CLASS);
  private static final Pattern FUNCTION = Pattern.compile("(cos|sin|cosh|sinh)\\(([^()]*)\\)");

  static PublishedSets of(PublishedEntry entry) {
    return new PublishedSets(FormulaPoints.numbers(entry), FormulaPoints.relations(entry));
  }

  /**
   * Compares strata, whatever their order.
   *
   * @param due what the tables list
   * @param found what the program lists
   * @return a sentence for each stratum that has no partner
   */
  List<String> strata(List<Stratum> due, List<Stratum> found) {
    List<Stratum> rest = new ArrayList<>(found);
    List<Stratum> lone = new ArrayList<>(due);
    lone.removeIf(rest::remove);
    List<String> differences = new ArrayList<>();
    for (Stratum d : lone) {
      Optional<Stratum> partner =
          rest.stream()
              .filter(f -> f.profile().equals(d.profile()) && same(d.equations(), f.equations()))
              .findFirst();
      partner.ifPresentOrElse(
          rest::remove, () -> differences.add("stratum due " + d + ", not found"));
    }
    rest.forEach(f -> differences.add("stratum found " + f + ", not due"));
    return differences;
  }

  /**
   * Compares a closed set with a union of closed sets.
   *
   * @param what for the sentence
   * @param due equations of the set
   * @param found the equations of each set of the union
   * @return a sentence, or nothing
   */
  List<String> union(String what, List<String> due, List<String> found) {
    String all = String.join("; ", due);
    Ring ring = ring(Stream.concat(Stream.of(all), found.stream()).toList());
    List<Polynomial> union =
        found.stream()
            .map(ring::ideal)
            .reduce((a, b) -> ring.bases().intersection(a, b))
            .orElseThrow();
    return ring.same(ring.ideal(all), union)
        ? List.of()
        : List.of(what + " due " + due + ", found the union of " + found);
  }

  private boolean same(String a, String b) {
    Ring ring = ring(List.of(a, b));
    return ring.same(ring.ideal(a), ring.ideal(b));
  }

  private Ring ring(List<String> texts) {
    TreeSet<String> names = new TreeSet<>(numbers.stream().map(Root::name).toList());
    for (String text : Stream.concat(texts.stream(), relations.stream()).toList()) {
      NAME.matcher(text).results().forEach(r -> names.add(r.group()));
    }
    for (String name : List.copyOf(names)) {
      Matcher f = FUNCTION.matcher(name);
      if (f.matches()) {
        String ending = f.group(1).endsWith("h") ? "h" : "";
        names.add("cos" + ending + "(" + f.group(2) + ")");
        names.add("sin" + ending + "(" + f.group(2) + ")");
      }
    }
    Variables variables = new Variables(List.copyOf(names));
    return new Ring(variables, new GroebnerBasis(Chain.free(variables)), this);
  }

  /** Polynomials in the names that the compared texts hold. */
  private record Ring(Variables variables, GroebnerBasis bases, PublishedSets sets) {

    boolean same(List<Polynomial> a, List<Polynomial> b) {
      return bases.reduced(a).equals(bases.reduced(b))
          || (a.stream().allMatch(p -> bases.radicalContains(b, p))
              && b.stream().allMatch(p -> bases.radicalContains(a, p)));
    }

    /** The equations of a text, and those that the functions and algebraic numbers satisfy. */
    List<Polynomial> ideal(String text) {
      List<Polynomial> out = new ArrayList<>();
      Arrays.stream(text.split(";")).map(this::polynomial).forEach(out::add);
      for (String name : variables.names()) {
        if (name.startsWith("cos(") || name.startsWith("cosh(")) {
          String sign = name.startsWith("cosh(") ? "-" : "+";
          out.add(polynomial(name + "^2 " + sign + " " + name.replace("cos", "sin") + "^2 - 1"));
        }
      }
      sets.relations().stream().map(this::polynomial).forEach(out::add);
      for (Root root : sets.numbers()) {
        Quantity x = Quantity.of(new Root(root.name(), List.of()));
        Quantity minimal = x.power(root.power().size());
        for (int k = 0; k < root.power().size(); k++) {
          minimal = minimal.minus(Quantity.of(root.power().get(k)).times(x.power(k)));
        }
        out.add(polynomial(minimal));
      }
      return out;
    }

    private Polynomial polynomial(String text) {
      Map<String, Quantity> names = new HashMap<>();
      for (String name : variables.names()) {
        names.put(name, Quantity.of(new Root(name, List.of())));
      }
      return polynomial(ExactText.value(text, names));
    }

    /** A multiple with integer coefficients. */
    private Polynomial polynomial(Quantity quantity) {
      BigInteger denominator =
          quantity.terms().values().stream()
              .map(BigFraction::getDenominator)
              .reduce(BigInteger.ONE, BigInteger::multiply);
      Polynomial sum = Polynomial.zero(variables);
      for (Map.Entry<SortedMap<Root, Integer>, BigFraction> term : quantity.terms().entrySet()) {
        BigInteger coefficient = term.getValue().multiply(denominator).getNumerator();
        Polynomial product = Polynomial.constant(variables, coefficient);
        for (Map.Entry<Root, Integer> f : term.getKey().entrySet()) {
          product =
              product.times(Polynomial.variable(variables, f.getKey().name()).pow(f.getValue()));
        }
        sum = sum.plus(product);
      }
      return sum;
    }
  }
}
