package rankfall.house;

import static com.tngtech.archunit.base.DescribedPredicate.describe;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.classes;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.fields;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static com.tngtech.archunit.library.GeneralCodingRules.ACCESS_STANDARD_STREAMS;
import static com.tngtech.archunit.library.dependencies.SlicesRuleDefinition.slices;

import com.tngtech.archunit.base.DescribedPredicate;
import com.tngtech.archunit.core.domain.JavaCall;
import com.tngtech.archunit.core.domain.JavaClass;
import com.tngtech.archunit.core.domain.JavaMember;
import com.tngtech.archunit.core.domain.JavaModifier;
import com.tngtech.archunit.lang.ArchRule;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import java.util.concurrent.ThreadLocalRandom;
import java.util.stream.Stream;

/**
 * The laws of the house, as DEVELOPERS.md states them, for the rooms below one root package.
 *
 * @param root the root package
 */
record HouseLaws(String root) {
  /** In the direction in which data goes: no room uses one to its right. */
  private static final List<String> ROOMS =
      List.of("spec", "exact", "lie", "locus", "identify", "scan", "report", "cli");

  private static final List<String> FOUNDATION =
      List.of("java..", "javax.xml..", "org.w3c.dom..", "org.apache.commons.numbers..");

  /** All laws; each reads as a sentence. */
  List<ArchRule> all() {
    List<ArchRule> laws = new ArrayList<>();
    laws.add(
        slices().matching(root + ".(*)..").should().beFreeOfCycles().as("rooms form no cycles"));
    laws.add(direction());
    laws.add(rootStaysBelowItsUsers());
    laws.add(roomsUseOnlyTheBudgetOfTheRoot());
    laws.add(only("Rings stays in exact", in("exact"), "cc.redberry.."));
    laws.add(only("Symja stays in AdjointTraces", adjointTraces(), "org.matheclipse.."));
    laws.add(
        only("JAS stays in exact and AdjointTraces", in("exact").or(adjointTraces()), "edu.jas.."));
    laws.add(only("CSV stays in report", in("report"), "org.apache.commons.csv.."));
    laws.add(only("JSON stays in report", in("report"), "com.fasterxml.jackson.."));
    laws.add(only("templates stay in report", in("report"), "io.pebbletemplates.."));
    laws.add(only("picocli stays in cli", in("cli"), "picocli.."));
    laws.add(only("YAML stays in spec", in("spec"), "org.snakeyaml.."));
    laws.add(noOtherLibrary());
    laws.add(
        forbidden(
            "no writer computes", in("report"), in("lie").or(in("locus")).or(in("identify"))));
    laws.add(
        forbidden(
            "the command line holds no mathematics",
            in("cli"),
            in("exact").or(in("lie")).or(in("locus")).or(in("identify"))));
    laws.add(
        forbidden(
            "mathematics touches no file",
            in("exact").or(in("lie")).or(in("locus")).or(in("identify")),
            describe("files", c -> c.getName().matches("java\\.(nio\\.file\\..*|io\\.File.*)"))));
    laws.add(
        noClasses()
            .that(DescribedPredicate.not(in("cli")))
            .should(ACCESS_STANDARD_STREAMS)
            .allowEmptyShould(true)
            .as("only cli speaks to the standard streams"));
    laws.add(
        noClasses()
            .should()
            .callMethodWhere(call("printStackTrace"))
            .allowEmptyShould(true)
            .as("nobody prints a stack"));
    laws.add(noUnseededChance());
    laws.add(
        fields()
            .that()
            .areStatic()
            .and(DescribedPredicate.not(synthetic()))
            .should()
            .beFinal()
            .allowEmptyShould(true)
            .as("no static state changes"));
    laws.add(
        noClasses()
            .should()
            .haveNameMatching(".*(Util|Utils|Helper|Manager|Impl)")
            .allowEmptyShould(true)
            .as("a class is named after what it is"));
    return List.copyOf(laws);
  }

  private ArchRule direction() {
    return classes()
        .should(new RoomOrder(ROOMS.stream().map(room -> root + "." + room).toList()))
        .allowEmptyShould(true)
        .as("data goes one way through the rooms");
  }

  private ArchRule rootStaysBelowItsUsers() {
    return forbidden(
        "the root package uses neither report nor cli",
        describe("the root package", c -> c.getPackageName().equals(root)),
        in("report").or(in("cli")));
  }

  private ArchRule roomsUseOnlyTheBudgetOfTheRoot() {
    return forbidden(
        "rooms of mathematics use nothing of the root package but Budget",
        in("spec").or(in("exact")).or(in("lie")).or(in("locus")).or(in("identify")),
        describe(
            "the root package without Budget",
            c -> c.getPackageName().equals(root) && !c.getName().equals(root + ".Budget")));
  }

  private ArchRule noOtherLibrary() {
    String[] known =
        Stream.concat(
                FOUNDATION.stream(),
                Stream.of(
                    root + "..",
                    "cc.redberry..",
                    "gnu.trove..",
                    "org.matheclipse..",
                    "edu.jas..",
                    "org.apache.commons.csv..",
                    "com.fasterxml.jackson..",
                    "io.pebbletemplates..",
                    "picocli..",
                    "org.snakeyaml.."))
            .toArray(String[]::new);
    return classes()
        .should()
        .onlyDependOnClassesThat()
        .resideInAnyPackage(known)
        .allowEmptyShould(true)
        .as("nothing else that a library drags in is used");
  }

  private static ArchRule noUnseededChance() {
    return noClasses()
        .should()
        .callConstructor(Random.class)
        .orShould()
        .callMethod(Math.class, "random")
        .orShould()
        .dependOnClassesThat()
        .areAssignableTo(ThreadLocalRandom.class)
        .allowEmptyShould(true)
        .as("chance has a seed");
  }

  private static ArchRule only(
      String law, DescribedPredicate<JavaClass> users, String librariesPackage) {
    return noClasses()
        .that(DescribedPredicate.not(users))
        .should()
        .dependOnClassesThat()
        .resideInAPackage(librariesPackage)
        .allowEmptyShould(true)
        .as(law);
  }

  private static ArchRule forbidden(
      String law, DescribedPredicate<JavaClass> users, DescribedPredicate<JavaClass> used) {
    return noClasses()
        .that(users)
        .should()
        .dependOnClassesThat(used)
        .allowEmptyShould(true)
        .as(law);
  }

  private DescribedPredicate<JavaClass> in(String room) {
    String home = root + "." + room;
    return describe(
        home, c -> c.getPackageName().equals(home) || c.getPackageName().startsWith(home + "."));
  }

  private DescribedPredicate<JavaClass> adjointTraces() {
    String name = root + ".lie.AdjointTraces";
    return describe(name, c -> c.getName().equals(name) || c.getName().startsWith(name + "$"));
  }

  private static DescribedPredicate<JavaCall<?>> call(String method) {
    return describe(method, call -> call.getTarget().getName().equals(method));
  }

  private static DescribedPredicate<JavaMember> synthetic() {
    return describe("synthetic", m -> m.getModifiers().contains(JavaModifier.SYNTHETIC));
  }
}
