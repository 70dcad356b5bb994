package rankfall.locus;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import rankfall.exact.Polynomial;
import rankfall.exact.RationalFunction;
import rankfall.lie.Family;
import rankfall.lie.KillingForm;
import rankfall.spec.SpecException;
import rankfall.spec.SpecReader;

/** The recomputation at a point agrees with the form, and notices a form that was tampered with. */
class SecondPathTest {
  private static Family family(String name) throws IOException, SpecException {
    Path file = Path.of("specs", name + ".yaml");
    return Family.of(SpecReader.read(file.toString(), Files.readAllBytes(file)).get(0).orThrow());
  }

  private static Optional<String> difference(Family f, ComponentForm c, KillingForm form) {
    Piece all = new Piece(f.ring().constants(), List.of());
    return SecondPath.difference(f, all, c.basis(), form, c.nonVanishing(), 7);
  }

  @ParameterizedTest
  @ValueSource(strings = {"scaled-ladder", "metric-rotations-3", "beam-of-spin-one"})
  void everyChangedEntryIsNoticed(String name) throws IOException, SpecException {
    Family f = family(name);
    Piece all = new Piece(f.ring().constants(), List.of());
    ComponentForm c = ComponentForm.of(f, all, List.of(), 1);
    assertEquals(Optional.empty(), difference(f, c, c.form()));
    int n = c.basis().size();
    for (int i = 0; i < n; i++) {
      for (int j = 0; j < n; j++) {
        assertTrue(difference(f, c, changed(c.form(), i, j)).isPresent(), i + ", " + j);
      }
    }
  }

  private static KillingForm changed(KillingForm form, int i, int j) {
    RationalFunction one = RationalFunction.of(Polynomial.one(form.chain().variables()));
    List<List<RationalFunction>> rows = new ArrayList<>();
    form.matrix().forEach(r -> rows.add(new ArrayList<>(r)));
    rows.get(i).set(j, rows.get(i).get(j).plus(one));
    return new KillingForm(form.chain(), rows);
  }
}
