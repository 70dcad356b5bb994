package rankfall.report;

import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.core.util.DefaultPrettyPrinter;
import com.fasterxml.jackson.core.util.Separators;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.ObjectWriter;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.JsonNodeFactory;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.UncheckedIOException;
import java.util.List;
import java.util.Optional;
import rankfall.AlgebraType;
import rankfall.Analysis.Signature;
import rankfall.PointResult;

/** One JSON object a point, on one line. */
public final class PointJson implements PointWriter {
  private static final JsonNodeFactory NODES = JsonNodeFactory.instance;

  private final ObjectWriter writer;

  /** Answers on lines of their own. */
  public PointJson() {
    Separators spaced =
        Separators.createDefaultInstance()
            .withObjectFieldValueSpacing(Separators.Spacing.AFTER)
            .withObjectEntrySpacing(Separators.Spacing.AFTER)
            .withArrayValueSpacing(Separators.Spacing.AFTER)
            .withObjectEmptySeparator("")
            .withArrayEmptySeparator("");
    DefaultPrettyPrinter.NopIndenter flat = DefaultPrettyPrinter.NopIndenter.instance;
    writer =
        new ObjectMapper()
            .writer(
                new DefaultPrettyPrinter(spaced).withObjectIndenter(flat).withArrayIndenter(flat));
  }

  @Override
  public String head() {
    return "";
  }

  @Override
  public String text(PointResult result) {
    ObjectNode out = NODES.objectNode();
    out.put("family", result.family());
    ObjectNode parameters = out.putObject("parameters");
    result.parameters().forEach(parameters::put);
    if (result instanceof PointResult.Facts facts) {
      facts(out, facts);
    } else {
      failure(out, (PointResult.Failure) result);
    }
    try {
      return writer.writeValueAsString(out) + "\n";
    } catch (JsonProcessingException e) {
      throw new UncheckedIOException("a tree cannot be written", e);
    }
  }

  private static void failure(ObjectNode out, PointResult.Failure f) {
    out.put("generators", f.generators());
    f.dimension().ifPresent(d -> out.put("dimension", d).put("closed", false));
    out.put("error", f.error());
  }

  private static void facts(ObjectNode out, PointResult.Facts f) {
    out.put("generators", f.generators());
    out.put("dimension", f.dimension());
    out.put("closed", true);
    out.set("killing", killing(f.killing()));
    out.set("derivedSeries", numbers(f.derivedSeries()));
    out.set("lowerCentralSeries", numbers(f.lowerCentralSeries()));
    out.put("centre", f.centre());
    out.put("radical", f.radical());
    out.put("nilradical", f.nilradical());
    out.put("unimodular", f.unimodular());
    ObjectNode forms = out.putObject("invariantForms");
    forms.put("dimension", f.invariantForms().dimension());
    if (f.invariantForms().maximal()) {
      forms.put("maximalRank", f.invariantForms().rank());
    } else {
      forms.putNull("maximalRank");
    }
    out.put("abelian", f.abelian());
    out.put("nilpotent", f.nilpotent());
    out.put("solvable", f.solvable());
    out.put("semisimple", f.semisimple());
    out.put("reductive", f.reductive());
    out.put("compact", f.compact());
    text(out, "stratum", f.stratum());
    text(out, "type", f.type().map(AlgebraType::name));
  }

  private static ObjectNode killing(PointResult.Killing k) {
    ObjectNode out = NODES.objectNode();
    out.put("rank", k.rank());
    if (k.signature().isPresent()) {
      Signature s = k.signature().get();
      out.put("plus", s.plus()).put("minus", s.minus()).put("zero", s.zero());
    } else {
      out.putNull("plus").putNull("minus").putNull("zero");
    }
    out.put("determinant", k.determinant());
    ArrayNode rows = out.putArray("matrix");
    for (List<String> row : k.matrix()) {
      ArrayNode cells = rows.addArray();
      row.forEach(cells::add);
    }
    return out;
  }

  private static ArrayNode numbers(List<Integer> list) {
    ArrayNode out = NODES.arrayNode();
    list.forEach(out::add);
    return out;
  }

  private static void text(ObjectNode out, String key, Optional<String> value) {
    value.ifPresentOrElse(v -> out.put(key, v), () -> out.putNull(key));
  }
}
