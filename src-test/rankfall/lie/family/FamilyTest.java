package rankfall.lie.family;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import rankfall.exact.Chain;
import rankfall.exact.Polynomial;
import rankfall.lie.Family;
import rankfall.lie.FamilyCondition;
import rankfall.lie.FamilySite;
import rankfall.spec.Spec.Relation;
import rankfall.spec.SpecException;

class FamilyTest {
  private static List<String> faults(Specs s) {
    return assertThrows(SpecException.class, () -> Family.of(s.build())).diagnostics().stream()
        .map(d -> d.place().line() + ": " + d.cause())
        .toList();
  }

  private static String outside(Family f, String... point) {
    return assertInstanceOf(FamilySite.Outside.class, f.at(Specs.point(point))).reason();
  }

  @Test
  void conditionsBecomeRelationsAndDomain() {
    Family f =
        Brackets.family(
            Specs.real("a", "b")
                .where("(a^2 + b^2)/b", Relation.EQUAL, "1/b")
                .where("b", Relation.GREATER, "0")
                .where("sqrt(2)", Relation.GREATER, "1")
                .bracket("X", "Y", "a*Y"));
    assertEquals(
        List.of("a^2 + b^2 - 1"),
        f.relations().stream().map(r -> r.polynomial().toString()).toList());
    assertEquals(
        List.of(Relation.GREATER), f.domain().stream().map(FamilyCondition::relation).toList());
    assertEquals(List.of("b"), f.poles().stream().map(Polynomial::toString).toList());
    assertEquals("the point is off the relation a^2 + b^2 - 1 = 0", outside(f, "a=1", "b=1"));
    assertEquals("entry has a pole: b = 0", outside(f, "a=1", "b=0"));
    assertEquals("outside the domain: b GREATER 0", outside(f, "a=3/5", "b=-4/5"));
    assertInstanceOf(FamilySite.Algebraic.class, f.at(Specs.point("a=3/5", "b=4/5")));
    assertEquals("no value is given for b", outside(f, "a=1"));
    assertEquals("'c' is no coordinate; they are a, b", outside(f, "a=1", "b=1", "c=1"));
  }

  @Test
  void signOfAnAlgebraicNumberIsCertified() {
    Family f =
        Brackets.family(
            Specs.real("a").where("a", Relation.LESS, "sqrt(2) + sqrt(3)").bracket("X", "Y", "Y"));
    // sqrt(2) + sqrt(3) = 3.14626436994...
    assertInstanceOf(FamilySite.Algebraic.class, f.at(Specs.point("a=314626436/100000000")));
    assertTrue(outside(f, "a=314626437/100000000").startsWith("outside the domain"));
  }

  @Test
  void contradictoryConditionsAreFaults() {
    assertEquals(
        List.of(
            "1: no point satisfies the condition 1 EQUAL 2",
            "4: no point satisfies the condition sqrt(2) GREATER 3/2"),
        faults(
            Specs.real("a")
                .where("1", Relation.EQUAL, "2")
                .where("sqrt(2)", Relation.GREATER, "3/2")
                .bracket("X", "Y", "Y")));
  }

  @Test
  void functionsOfParameters() {
    Family f =
        Brackets.family(
            Specs.real("t", "u")
                .bracket("X", "Y", "cos(2*t)*Y + sin(t-u)*Z")
                .bracket("X", "Z", "tan(u)*Z + cosh(t)*exp(-2*t)*Y"));
    assertEquals(
        List.of("cos(t)", "sin(t)", "exp(t)", "cos(u)", "sin(u)"), f.ring().variables().names());
    assertEquals(
        List.of("cos(u)", "exp(t)"), f.poles().stream().map(Polynomial::toString).toList());
    assertEquals(List.of("exp(t) > 0"), f.domain().stream().map(FamilyCondition::text).toList());
    assertEquals(
        List.of("cos(t)^2 + sin(t)^2 - 1", "cos(u)^2 + sin(u)^2 - 1"),
        f.relations().stream().map(r -> r.polynomial().toString()).toList());
    assertEquals(
        List.of(
            "[X,Y]=(2*cos(t)^2 - 1)Y+(-cos(t)*sin(u) + sin(t)*cos(u))Z",
            "[X,Z]=((exp(t)^2 + 1)/(2*exp(t)^3))Y+(sin(u)/cos(u))Z"),
        Brackets.of(f));
    assertInstanceOf(
        FamilySite.Rational.class, f.at(Specs.point("t=0", "cos(u)=3/5", "sin(u)=4/5")));
    assertEquals(
        "cos(t) is irrational at t = 1; give values of cos(t) and sin(t) instead of t",
        outside(f, "t=1", "u=0"));
    assertEquals(
        "the point is off the relation cos(u)^2 + sin(u)^2 - 1 = 0",
        outside(f, "t=0", "cos(u)=1", "sin(u)=1"));
  }

  @Test
  void hyperbolicFunctionsWithoutExp() {
    Family f = Brackets.family(Specs.real("t").bracket("X", "Y", "cosh(2*t)*Y + t*Y"));
    assertEquals(List.of("t", "cosh(t)", "sinh(t)"), f.ring().variables().names());
    assertEquals(List.of("[X,Y]=(2*cosh(t)^2 + t - 1)Y"), Brackets.of(f));
    Family g = Brackets.family(Specs.real("t").bracket("X", "Y", "cosh(t)*Y"));
    assertEquals("outside the domain: cosh(t) >= 1", outside(g, "cosh(t)=-1", "sinh(t)=0"));
    assertInstanceOf(FamilySite.Rational.class, g.at(Specs.point("t=0")));
  }

  @Test
  void bracketsThatDisagree() {
    Specs agree =
        Specs.real("a").bracket("X", "Y", "(a+1)^2*Y").bracket("Y", "X", "-(a^2+2*a+1)*Y");
    assertEquals(List.of("[X,Y]=(a^2 + 2*a + 1)Y"), Brackets.of(Brackets.family(agree)));
    assertEquals(
        List.of("4: [Y, X] is given twice with different values, first at 2:1"),
        faults(Specs.real("a").bracket("X", "Y", "a*Y").bracket("Y", "X", "a*Y")));
    assertEquals(
        List.of("2: the bracket of X with itself is not 0"),
        faults(Specs.real("a").generators("Y").bracket("X", "X", "a*Y")));
  }

  @Test
  void divisionByZeroThroughout() {
    assertEquals(
        List.of("1: division by an expression that is 0 for all parameter values"),
        faults(Specs.real("a").bracket("X", "Y", "Y/(sqrt(6) - sqrt(2)*sqrt(3))")));
    assertEquals(
        List.of("1: division by an expression that is 0 for all parameter values"),
        faults(Specs.real("t").bracket("X", "Y", "Y/(cos(t)^2 + sin(t)^2 - 1)")));
  }

  @Test
  void structureConstantsOfARealAlgebraAreReal() {
    assertEquals(
        List.of("2: a real algebra with a non-real structure constant"),
        faults(Specs.real("a").bracket("X", "Y", "i*a*Y")));
    assertEquals(
        List.of("2: a real algebra with a non-real structure constant"),
        faults(Specs.real("a").hermitian().bracket("X", "Y", "a*Y")));
    assertEquals(
        List.of("[X,Y]=(i*a)Y"),
        Brackets.of(Brackets.family(Specs.complex("a").bracket("X", "Y", "i*a*Y"))));
  }

  @Test
  void constantThatLiesInTheTowerIsNoVariable() {
    // (x^2 - 2)(x - 3) near 1.4: the root of 2; x^4 - 10 x^2 + 1: sqrt(2) + sqrt(3)
    Family f =
        Brackets.family(
            Specs.real()
                .constant("u", 1.4, 6, -2, -3, 1)
                .constant("v", 3.1, 1, 0, -10, 0, 1)
                .bracket("X", "Y", "(u + v + sqrt(2) + 0*sqrt(3))*Y"));
    assertEquals(List.of("sqrt(2)", "sqrt(3)"), f.ring().variables().names());
    assertEquals(List.of("[X,Y]=(3*sqrt(2) + sqrt(3))Y"), Brackets.of(f));
  }

  @Test
  void constantsWithoutRootAreFaults() {
    assertEquals(
        List.of(
            "1: the constant 'u' is not determined: the polynomial has no real root",
            "2: the constant 'v' is not determined: two real roots are equally near"),
        faults(
            Specs.real()
                .constant("u", 1, 1, 0, 1)
                .constant("v", 0, -2, 0, 1)
                .bracket("X", "Y", "u*Y")));
  }

  @Test
  void poleThatCancelsStillExcludes() {
    Family f =
        Brackets.family(
            Specs.real("a")
                .abbreviation("D", "1/(a^2 - 1)")
                .matrix("X", "0,D*(a-1);0,0")
                .matrix("Y", "a/a,0;0,0"));
    assertEquals(
        List.of("a", "a + 1", "a - 1"), f.poles().stream().map(Polynomial::toString).toList());
    assertEquals("entry has a pole: a - 1 = 0", outside(f, "a=1"));
    Polynomial a = Polynomial.variable(f.ring().variables(), 0);
    Chain point =
        new Chain(
            f.ring().variables(),
            List.of(new Chain.Rule(0, a.plus(Polynomial.one(f.ring().variables())))));
    assertEquals(new FamilySite.Outside("entry has a pole: a + 1 = 0"), f.on(point));
  }

  @Test
  void faultsOfExpressions() {
    assertEquals(
        List.of(
            "1: a product of two generators or matrices",
            "3: division by a generator or matrix",
            "5: a number is added to a generator or matrix"),
        faults(
            Specs.real("a")
                .bracket("X", "Y", "X*Y")
                .bracket("X", "Z", "a/X")
                .bracket("Y", "Z", "X + 1")));
  }
}
