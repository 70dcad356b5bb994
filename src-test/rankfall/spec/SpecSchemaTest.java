package rankfall.spec;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.networknt.schema.Error;
import com.networknt.schema.Schema;
import com.networknt.schema.SchemaRegistry;
import com.networknt.schema.SpecificationVersion;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.snakeyaml.engine.v2.api.Load;
import org.snakeyaml.engine.v2.api.LoadSettings;

class SpecSchemaTest {
  private final ObjectMapper json = new ObjectMapper();

  private List<Error> errors(String yaml) throws IOException {
    Schema schema =
        SchemaRegistry.withDefaultDialect(SpecificationVersion.DRAFT_2020_12)
            .getSchema(SpecSchema.text());
    Object value = new Load(LoadSettings.builder().build()).loadFromString(yaml);
    JsonNode node = json.valueToTree(value);
    return schema.validate(node);
  }

  @Test
  void familiesWithEveryKeyAreRight() throws IOException {
    assertEquals(List.of(), errors(SpecReaderTest.TILTED_GYROSCOPE));
    assertEquals(List.of(), errors(SpecReaderTest.BENT_LATTICE));
  }

  @Test
  void theSchemaNamesTheKeysOfTheReader() throws IOException {
    Set<String> keys = new TreeSet<>();
    json.readTree(SpecSchema.text()).get("properties").fieldNames().forEachRemaining(keys::add);
    assertEquals(new TreeSet<>(DocumentReader.KEYS), keys);
  }

  /** What the reader says of these cases is in their golden files. */
  @ParameterizedTest
  @ValueSource(
      strings = {
        "unknown-key",
        "reserved-names",
        "unusable-name",
        "order-no-integer",
        "wrong-words",
        "wrong-kinds",
        "family-missing",
        "family-name-bad",
        "both-presentations",
        "no-presentation",
        "misplaced-keys",
        "not-a-mapping"
      })
  void faultsOfShapeAreFoundByTheSchemaToo(String name) throws IOException {
    String yaml = Files.readString(Path.of("src-test/rankfall/spec/cases", name + ".yaml"));
    assertFalse(errors(yaml).isEmpty());
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "constants: {w: {minimal: \"x^2 - 2\"}}",
        "constants: {w: 1.4}",
        "scan: {a: {from: 0, to: 1}}",
        "scan: {a: {from: 0, to: 1, points: 1}}",
        "scan: {a: []}",
        "where: [a]",
        "where: b > 0",
        "parameters: [a, a]",
        "covectors: {k: {X: 1}}",
        "abbreviations: {D: [1]}"
      })
  void aRightSpecWithOneWrongLineIsRefused(String line) throws IOException {
    String right = "family: f\nbrackets: \"[X, Y] = Z\"\n";
    assertEquals(List.of(), errors(right));
    assertFalse(errors(right + line + "\n").isEmpty());
  }
}
