package rankfall;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.apache.commons.numbers.fraction.BigFraction;
import rankfall.Analysis.MatrixEntry;
import rankfall.Forms.Angle;
import rankfall.Forms.Covector;
import rankfall.Forms.RootOutcome;
import rankfall.Forms.Roots;
import rankfall.Forms.TorusForm;
import rankfall.Forms.UnitVector;
import rankfall.Forms.WithoutRoots;
import rankfall.exact.Chain;
import rankfall.exact.ChainFractions;
import rankfall.exact.RationalFunction;
import rankfall.lie.CommutingElements;
import rankfall.lie.Family;
import rankfall.lie.FamilySite;
import rankfall.lie.ListedElement;
import rankfall.lie.RestrictedForm;
import rankfall.lie.SimpleRoots;
import rankfall.lie.TorusRoots;
import rankfall.locus.ComponentForm;
import rankfall.spec.Expression;
import rankfall.spec.Spec;
import rankfall.spec.SpecException;

/** The Killing form on the torus of a spec, at the general point of a component. */
record TorusFindings(Spec spec, Family family, ComponentForm component) {

  /** Ends the analysis: the torus of the spec is none. The message names place and remedy. */
  static final class Fault extends RuntimeException {
    private static final long serialVersionUID = 1L;

    Fault(String headline) {
      super(headline);
    }
  }

  /**
   * The form on the torus.
   *
   * @return empty if the spec names no torus, or if the algebra is 0
   * @throws Fault if the elements do not commute, or are dependent
   */
  Optional<TorusForm> find() {
    if (spec.torus().isEmpty() || component.basis().isEmpty()) {
      return Optional.empty();
    }
    Chain chain = component.chain();
    List<List<RationalFunction>> vectors = vectors();
    CommutingElements elements = CommutingElements.of(chain, component.constants(), vectors);
    requireTorus(elements);
    RestrictedForm onAlgebra = RestrictedForm.of(chain, component.form().matrix(), vectors);
    if (family.ring().complex()) {
      return Optional.of(form(elements, onAlgebra, false, Optional.empty()));
    }
    PositiveCone cone = new PositiveCone(family, chain);
    PositiveCone.Answer negative = cone.of(onAlgebra.negate());
    boolean imaginary = negative.certainlySomewhere();
    return Optional.of(
        imaginary
            ? form(elements, onAlgebra.negate(), true, Optional.of(negative.positivity()))
            : form(elements, onAlgebra, false, Optional.of(cone.of(onAlgebra).positivity())));
  }

  private List<List<RationalFunction>> vectors() {
    FamilySite.Algebraic site = (FamilySite.Algebraic) family.on(component.chain());
    List<List<RationalFunction>> out = new ArrayList<>();
    for (String name : spec.torus()) {
      out.add(
          ListedElement.in(component.chain(), site.input(), component.basis(), name)
              .orElseThrow(
                  () -> new IllegalStateException("a generator outside the span: " + name)));
    }
    return out;
  }

  private void requireTorus(CommutingElements elements) {
    Optional<List<Integer>> clash = elements.clash();
    if (clash.isPresent()) {
      String x = spec.torus().get(clash.get().get(0));
      String y = spec.torus().get(clash.get().get(1));
      throw fault(
          clash.get().get(1),
          "'" + x + "' and '" + y + "' in 'torus' do not commute" + where(),
          "list commuting generators, or leave one of the two out");
    }
    Optional<Integer> dependent = elements.dependent();
    if (dependent.isPresent()) {
      throw fault(
          dependent.get(),
          "'"
              + spec.torus().get(dependent.get())
              + "' in 'torus' is a combination of the elements before it"
              + where(),
          "list independent generators");
    }
  }

  private String where() {
    return family.ring().variables().indeterminates() == 0
        ? ""
        : " at a general point of the parameters";
  }

  private Fault fault(int element, String cause, String advice) {
    return new Fault(
        spec.source()
            .fault(spec.source().torusPlaces().get(element), cause, Optional.of(advice))
            .headline());
  }

  private TorusForm form(
      CommutingElements elements,
      RestrictedForm k,
      boolean imaginary,
      Optional<Forms.Positivity> positive) {
    Optional<RestrictedForm> dual = k.dual();
    List<UnitVector> orthonormal =
        positive.map(p -> p.somewhere()).orElse(false)
            ? k.orthogonal().orElse(List.of()).stream()
                .map(v -> new UnitVector(v.coefficients(), v.squaredLength()))
                .toList()
            : List.of();
    return new TorusForm(
        spec.torus(),
        imaginary,
        entries(k),
        positive,
        orthonormal,
        angles(k),
        dual.map(TorusFindings::entries),
        dual.map(this::angles).orElse(List.of()),
        dual.map(this::covectors).orElse(List.of()),
        roots(elements, dual, imaginary));
  }

  private static List<MatrixEntry> entries(RestrictedForm k) {
    List<MatrixEntry> out = new ArrayList<>();
    for (int i = 0; i < k.matrix().size(); i++) {
      for (int j = i; j < k.matrix().size(); j++) {
        if (!k.matrix().get(i).get(j).isZero()) {
          out.add(new MatrixEntry(i, j, k.matrix().get(i).get(j)));
        }
      }
    }
    return out;
  }

  private List<Angle> angles(RestrictedForm k) {
    List<Angle> out = new ArrayList<>();
    for (int i = 0; i < k.matrix().size(); i++) {
      for (int j = i + 1; j < k.matrix().size(); j++) {
        out.add(angle(k.matrix(), i, j));
      }
    }
    return out;
  }

  private Angle angle(List<List<RationalFunction>> k, int i, int j) {
    RationalFunction product = k.get(i).get(j);
    RationalFunction squaredLength = k.get(i).get(i);
    RationalFunction lengths = squaredLength.times(k.get(j).get(j));
    Optional<RationalFunction> square =
        lengths.isZero()
            ? Optional.empty()
            : Optional.of(canonical(product.times(product).over(lengths)));
    return new Angle(
        i, j, product, square, square.flatMap(s -> degrees(s, product, squaredLength)));
  }

  private RationalFunction canonical(RationalFunction f) {
    return ChainFractions.canonical(component.chain(), f);
  }

  /** The angle where it does not depend on parameters; a squared length is positive. */
  private Optional<Integer> degrees(
      RationalFunction squaredCosine, RationalFunction product, RationalFunction squaredLength) {
    if (family.ring().complex() || !squaredCosine.isConstant()) {
      return Optional.empty();
    }
    RationalFunction ratio = canonical(product.over(squaredLength));
    int own = family.ring().variables().indeterminates();
    boolean number =
        ratio.numerator().support().stream().allMatch(v -> v >= own)
            && ratio.denominator().isConstant();
    if (!number) {
      return Optional.empty();
    }
    int sign = family.ring().tower().sign(ratio.numerator());
    BigFraction fourfold = squaredCosine.constantValue().multiply(4);
    for (int k = 0; k < 4; k++) {
      if (fourfold.equals(BigFraction.of(k))) {
        int acute = List.of(90, 60, 45, 30).get(k);
        return Optional.of(sign < 0 ? 180 - acute : acute);
      }
    }
    return Optional.empty();
  }

  private List<Covector> covectors(RestrictedForm dual) {
    List<Covector> out = new ArrayList<>();
    for (Map.Entry<String, Map<String, Expression>> e : spec.covectors().entrySet()) {
      List<RationalFunction> components =
          spec.torus().stream().map(t -> component(e.getValue().get(t))).toList();
      List<RationalFunction> sharp = new ArrayList<>();
      for (List<RationalFunction> row : dual.matrix()) {
        RationalFunction sum = RationalFunction.of(component.chain().zero());
        for (int k = 0; k < row.size(); k++) {
          sum = sum.plus(row.get(k).times(components.get(k)));
        }
        sharp.add(canonical(sum));
      }
      out.add(
          new Covector(
              e.getKey(),
              components,
              sharp,
              RestrictedForm.value(component.chain(), dual.matrix(), components, components)));
    }
    return out;
  }

  /** What is not listed is 0. */
  private RationalFunction component(Expression value) {
    if (value == null) {
      return RationalFunction.of(component.chain().zero());
    }
    try {
      return canonical(family.value(value));
    } catch (SpecException e) {
      throw new Fault(e.diagnostics().get(0).headline());
    }
  }

  private RootOutcome roots(
      CommutingElements elements, Optional<RestrictedForm> dual, boolean imaginary) {
    int centraliser = elements.centraliser();
    if (centraliser > elements.count()) {
      return new WithoutRoots(
          "The torus is no Cartan subalgebra: its centraliser has dimension " + centraliser + ".");
    }
    if (dual.isEmpty()) {
      return new WithoutRoots("The form is degenerate on the torus, so roots have no lengths.");
    }
    TorusRoots roots = TorusRoots.of(elements);
    if (roots instanceof TorusRoots.NotTold n) {
      return new WithoutRoots("The roots are not told: " + n.reason() + ".");
    }
    TorusRoots.Found found = (TorusRoots.Found) roots;
    boolean matches = found.imaginary() == imaginary || found.roots().isEmpty();
    return (matches ? SimpleRoots.of(dual.get(), found.roots()) : Optional.<SimpleRoots>empty())
        .<RootOutcome>map(
            s ->
                new Roots(
                    s.type(), s.simple(), s.squaredLengths(), s.cartan().rows(), s.positive()))
        .orElseGet(
            () ->
                new WithoutRoots(
                    "The eigenvalues of the torus form no root system with this form."));
  }
}
