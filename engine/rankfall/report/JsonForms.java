package rankfall.report;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.JsonNodeFactory;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import rankfall.Analysis.MatrixEntry;
import rankfall.Analysis.Quotient;
import rankfall.Forms.Angle;
import rankfall.Forms.Casimir;
import rankfall.Forms.Covector;
import rankfall.Forms.Extent;
import rankfall.Forms.FormDeviation;
import rankfall.Forms.InvariantForms;
import rankfall.Forms.InverseMember;
import rankfall.Forms.Positivity;
import rankfall.Forms.Roots;
import rankfall.Forms.TorusForm;
import rankfall.Forms.UnitVector;
import rankfall.Forms.WithoutRoots;
import rankfall.SignCondition;

/** Torus, Casimir element and invariant forms as parts of {@code result.json}. */
final class JsonForms {
  private static final JsonNodeFactory NODES = JsonNodeFactory.instance;

  private JsonForms() {}

  /** The form on a torus. */
  static ObjectNode torus(TorusForm t) {
    ObjectNode out = NODES.objectNode();
    out.set("elements", texts(t.elements()));
    out.put("span", t.imaginary() ? "imaginary" : "real");
    out.set("form", entries(t.form(), t.elements()));
    if (t.positive().isPresent()) {
      out.set("positive_definite", positivity(t.positive().get()));
    } else {
      out.putNull("positive_definite");
    }
    ArrayNode orthonormal = NODES.arrayNode();
    t.orthonormal().forEach(v -> orthonormal.add(unit(v, t.elements())));
    out.set("orthonormal", orthonormal);
    out.set("angles", angles(t.angles(), t.elements()));
    if (t.dual().isPresent()) {
      out.set("dual", entries(t.dual().get(), t.elements()));
    } else {
      out.putNull("dual");
    }
    out.set("dual_angles", angles(t.dualAngles(), t.elements()));
    ArrayNode covectors = NODES.arrayNode();
    t.covectors().forEach(c -> covectors.add(covector(c, t.elements())));
    out.set("covectors", covectors);
    if (t.roots() instanceof Roots r) {
      out.set("roots", roots(r, t.elements()));
      out.putNull("without_roots");
    } else {
      out.putNull("roots");
      out.put("without_roots", ((WithoutRoots) t.roots()).reason());
    }
    return out;
  }

  private static ObjectNode positivity(Positivity p) {
    return NODES
        .objectNode()
        .put("somewhere", p.somewhere())
        .set("conditions", texts(p.conditions().stream().map(SignCondition::toString).toList()));
  }

  private static ObjectNode unit(UnitVector v, List<String> elements) {
    ObjectNode out = NODES.objectNode();
    out.set("combination", values(v.coefficients(), elements));
    out.put("squared_length", v.squaredLength().toString());
    return out;
  }

  private static ObjectNode values(List<?> values, List<String> names) {
    ObjectNode out = NODES.objectNode();
    for (int k = 0; k < names.size(); k++) {
      if (!values.get(k).toString().equals("0")) {
        out.put(names.get(k), values.get(k).toString());
      }
    }
    return out;
  }

  private static ArrayNode angles(List<Angle> angles, List<String> elements) {
    ArrayNode out = NODES.arrayNode();
    for (Angle a : angles) {
      ObjectNode node = NODES.objectNode();
      node.put("first", elements.get(a.first())).put("second", elements.get(a.second()));
      node.put("product", a.product().toString());
      node.put("squared_cosine", a.squaredCosine().map(Object::toString).orElse(null));
      node.put("degrees", a.degrees().orElse(null));
      out.add(node);
    }
    return out;
  }

  private static ObjectNode covector(Covector c, List<String> elements) {
    ObjectNode out = NODES.objectNode().put("name", c.name());
    out.set("components", values(c.components(), elements));
    out.set("sharp", values(c.sharp(), elements));
    return out.put("squared_length", c.squaredLength().toString());
  }

  private static ObjectNode roots(Roots r, List<String> elements) {
    ObjectNode out = NODES.objectNode().put("type", r.type());
    ArrayNode simple = NODES.arrayNode();
    for (int k = 0; k < r.simple().size(); k++) {
      ObjectNode root = NODES.objectNode();
      root.set("values", values(r.simple().get(k), elements));
      simple.add(root.put("squared_length", r.squaredLengths().get(k).toString()));
    }
    out.set("simple", simple);
    out.set("cartan_matrix", numbers(r.cartan()));
    out.set("positive", numbers(r.positive()));
    return out;
  }

  private static ArrayNode numbers(List<List<Integer>> rows) {
    ArrayNode out = NODES.arrayNode();
    for (List<Integer> row : rows) {
      ArrayNode numbers = NODES.arrayNode();
      row.forEach(numbers::add);
      out.add(numbers);
    }
    return out;
  }

  /** The coefficients of a Casimir element. */
  static ArrayNode casimir(Casimir c, List<String> basis) {
    return entries(c.entries(), basis);
  }

  /** The invariant forms of a stratum. */
  static ObjectNode invariantForms(InvariantForms f, List<String> basis) {
    ObjectNode out = NODES.objectNode();
    out.put("dimension", f.extent() == Extent.UNDECIDED ? null : f.dimension());
    out.put("non_degenerate", word(f.nonDegenerate()));
    out.put("extent", word(f.extent()));
    out.set("coefficients", texts(f.coefficients()));
    ArrayNode forms = NODES.arrayNode();
    f.basis().forEach(b -> forms.add(entries(b, basis)));
    out.set("basis", forms);
    Optional<Quotient> d = f.determinant();
    out.put("determinant", d.map(q -> q.numerator().toString()).orElse(null));
    if (f.inverse().isPresent()) {
      out.set("inverse", inverse(f.inverse().get(), f.coefficients(), basis));
    } else {
      out.putNull("inverse");
    }
    ArrayNode deviations = NODES.arrayNode();
    f.deviations().forEach(x -> deviations.add(deviation(x)));
    out.set("deviations", deviations);
    out.put("settled", f.settled());
    return out;
  }

  private static ObjectNode inverse(
      InverseMember m, List<String> coefficients, List<String> basis) {
    ObjectNode out = NODES.objectNode();
    ObjectNode weights = NODES.objectNode();
    for (int k = 0; k < m.weights().size(); k++) {
      weights.put(coefficients.get(k), m.weights().get(k));
    }
    out.set("member", weights);
    out.set("entries", entries(m.entries(), basis));
    return out;
  }

  private static ObjectNode deviation(FormDeviation d) {
    ObjectNode out = NODES.objectNode();
    out.set("equations", texts(d.equations().stream().map(Object::toString).toList()));
    return out.put("dimension", d.dimension()).put("non_degenerate", word(d.nonDegenerate()));
  }

  private static ArrayNode entries(List<MatrixEntry> entries, List<String> names) {
    ArrayNode out = NODES.arrayNode();
    for (MatrixEntry e : entries) {
      out.add(
          NODES
              .objectNode()
              .put("row", names.get(e.row()))
              .put("column", names.get(e.column()))
              .put("entry", e.value().toString()));
    }
    return out;
  }

  private static ArrayNode texts(List<String> list) {
    ArrayNode out = NODES.arrayNode();
    list.forEach(out::add);
    return out;
  }

  private static String word(Enum<?> value) {
    return value.name().toLowerCase(Locale.ROOT);
  }
}
