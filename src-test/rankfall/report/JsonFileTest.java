package rankfall.report;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.networknt.schema.InputFormat;
import com.networknt.schema.Schema;
import com.networknt.schema.SchemaRegistry;
import com.networknt.schema.SpecificationVersion;
import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;
import rankfall.Analysis;
import rankfall.Analysis.Status;

class JsonFileTest {
  private static Schema schema() throws IOException {
    try (InputStream in = JsonFile.class.getResourceAsStream("result-schema.json")) {
      return SchemaRegistry.withDefaultDialect(SpecificationVersion.DRAFT_2020_12)
          .getSchema(new String(in.readAllBytes(), StandardCharsets.UTF_8));
    }
  }

  static Stream<Analysis> samples() {
    return Stream.of(
        SampleAnalyses.scaled(),
        SampleAnalyses.scaled(Status.INCOMPLETE, "", ""),
        SampleAnalyses.failed(),
        SampleAnalyses.stratified(),
        SampleAnalyses.undecomposed(),
        LargeAnalyses.large(6));
  }

  @ParameterizedTest
  @MethodSource("samples")
  void everySampleFitsTheSchema(Analysis a) throws IOException {
    assertEquals("[]", schema().validate(JsonFile.of(a), InputFormat.JSON).toString());
  }

  /** Each pair makes one change that the schema must refuse. */
  @ParameterizedTest
  @ValueSource(
      strings = {
        "\"status\" : \"complete\"->\"status\" : \"done\"",
        "\"status\" : \"complete\"->\"status\" : \"failed\"",
        "\"rank\" : 3->\"rank\" : -3",
        "\"format\" : 1->\"format\" : 2",
        "\"left\" : \"H\"->\"links\" : \"H\"",
        "\"real_points\" : \"yes\"->\"real_points\" : true"
      })
  void schemaRefusesOtherShapes(String change) throws IOException {
    String[] pair = change.split("->");
    String good = JsonFile.of(SampleAnalyses.scaled());
    assertTrue(good.contains(pair[0]), pair[0]);
    String bad = good.replaceFirst(java.util.regex.Pattern.quote(pair[0]), pair[1]);
    assertFalse(schema().validate(bad, InputFormat.JSON).isEmpty());
  }

  @Test
  void valuesAreThoseOfTheAnalysis() throws IOException {
    JsonNode root = new ObjectMapper().readTree(JsonFile.of(SampleAnalyses.scaled()));
    assertEquals(SampleAnalyses.SHA, root.at("/spec/sha256").asText());
    assertEquals("0.1.0", root.at("/program/version").asText());
    JsonNode c = root.at("/findings/components/0");
    assertEquals("alpha/b_1", c.at("/structure/2/coefficient").asText());
    assertEquals("-128*alpha^2", c.at("/killing/determinant/numerator").asText());
    assertEquals("b_1^2", c.at("/killing/determinant/denominator").asText());
    assertEquals("{\"X\":\"1\"}", c.at("/conditions/0/kernel/0").toString());
    assertTrue(root.at("/findings/strata").isNull());
  }

  @Test
  void endsLinesWithLineFeedsOnly() {
    assertFalse(JsonFile.of(SampleAnalyses.stratified()).contains("\r"));
  }
}
