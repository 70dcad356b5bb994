package rankfall.identify;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Random;
import java.util.stream.Stream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import rankfall.published.PublishedEntry;
import rankfall.published.PublishedTables;

/**
 * The kinematical algebras of Bacry and Levy-Leblond, J. Math. Phys. 9 (1968) 1605, and that of
 * Bargmann 1954; brackets from memory.
 */
class KinematicalTest {

  /** A point and the name that the source gives to it. */
  record World(String spec, PublishedEntry.Point point) {
    @Override
    public String toString() {
      return point.world().orElseThrow() + " " + point.at();
    }
  }

  static Stream<World> worlds() {
    return PublishedTables.all().stream()
        .flatMap(
            e ->
                e.points().stream()
                    .filter(p -> p.world().isPresent() && "7".equals(p.facts().get("radical")))
                    .map(p -> new World(e.spec(), p)));
  }

  @ParameterizedTest
  @MethodSource("worlds")
  void worldOfTheTable(World w) {
    ExactAlgebra g = PointAlgebra.of(w.spec(), w.point().at());
    TypeName name = Kinematical.of(g).orElseThrow();
    String due = w.point().world().orElseThrow().replaceFirst(", (.*)", " ($1)");
    assertTrue(name.name().equals(due) || name.otherNames().contains(due), name::toString);
    assertEquals(Optional.of(name), Kinematical.of(Turned.of(g, new Random(1), 12)));
  }

  @ParameterizedTest
  @CsvSource({
    "carroll-3-1, Carroll",
    "galilei-3-1, Galilei",
  })
  void singleAlgebras(String id, String due) {
    assertEquals(due, Kinematical.of(PointAlgebra.of(spec(id), Map.of())).orElseThrow().name());
  }

  /** With mass 0 the central element splits off: no Bargmann algebra. */
  @ParameterizedTest
  @CsvSource({"1, Bargmann", "-2, Bargmann", "0, ''"})
  void massMakesTheExtension(String m, String due) {
    ExactAlgebra g = PointAlgebra.of(spec("bargmann-3-1"), Map.of("m", m));
    assertEquals(due, Kinematical.of(g).map(TypeName::name).orElse(""));
    ExactAlgebra turned = Turned.of(g, new Random(2), 10);
    assertEquals(due, Kinematical.of(turned).map(TypeName::name).orElse(""));
  }

  private static String spec(String id) {
    return PublishedTables.all().stream()
        .filter(e -> e.id().equals(id))
        .findFirst()
        .orElseThrow()
        .spec();
  }

  /**
   * Algebras with the same dimensions of radical and Levi factor that are none of these: other
   * modules, other rotations, an energy that stretches with a trace.
   */
  static List<String> others() {
    return List.of(
        // sl(2,R) in place of so(3)
        rotations(-1) + "[H,K1] = P1\n  [H,K2] = P2\n  [H,K3] = P3\n",
        // so(3) + R^7
        "[J1,J2] = J3\n  [J2,J3] = J1\n  [J3,J1] = J2\n",
        // H acts as 1 on all vectors
        rotations(1)
            + "[H,K1] = K1\n  [H,K2] = K2\n  [H,K3] = K3\n"
            + "  [H,P1] = P1\n  [H,P2] = P2\n  [H,P3] = P3\n",
        // [K, K] = P as vectors, no energy
        rotations(1) + "[K1,K2] = P3\n  [K2,K3] = P1\n  [K3,K1] = P2\n",
        // so(3) on vectors once, and trivially on R^4
        "[J1,J2] = J3\n  [J2,J3] = J1\n  [J3,J1] = J2\n  [J1,P2] = P3\n  [J2,P1] = -P3\n"
            + "  [J2,P3] = P1\n  [J3,P2] = -P1\n  [J3,P1] = P2\n  [J1,P3] = -P2\n");
  }

  /** J1, J2, J3 with a metric (1, 1, s), acting on two vectors K and P. */
  private static String rotations(int s) {
    StringBuilder out = new StringBuilder();
    for (String v : List.of("J", "K", "P")) {
      String form =
          "[J1,%2] = @%3\n  [J2,%3] = %1\n  [J3,%1] = %2\n  "
              + (v.equals("J") ? "" : "[J2,%1] = -@%3\n  [J3,%2] = -%1\n  [J1,%3] = -%2\n  ");
      out.append(form.replace("%", v).replace("@", s < 0 ? "-1*" : "1*").replace("--1*", "1*"));
    }
    return out.toString();
  }

  @ParameterizedTest
  @MethodSource("others")
  void othersHaveNoSuchName(String brackets) {
    String yaml =
        "family: test\ngenerators: [H, P1, P2, P3, K1, K2, K3, J1, J2, J3]\nbrackets: |\n  ";
    assertEquals(Optional.empty(), Kinematical.of(PointAlgebra.of(yaml + brackets, Map.of())));
  }
}
