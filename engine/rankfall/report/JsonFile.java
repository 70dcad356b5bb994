package rankfall.report;

import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.core.util.DefaultIndenter;
import com.fasterxml.jackson.core.util.DefaultPrettyPrinter;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.JsonNodeFactory;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.UncheckedIOException;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.function.BiConsumer;
import rankfall.AlgebraType;
import rankfall.Analysis;
import rankfall.Analysis.Combination;
import rankfall.Analysis.Component;
import rankfall.Analysis.Condition;
import rankfall.Analysis.Contracted;
import rankfall.Analysis.Contraction;
import rankfall.Analysis.Coordinate;
import rankfall.Analysis.Findings;
import rankfall.Analysis.Killing;
import rankfall.Analysis.MatrixEntry;
import rankfall.Analysis.Region;
import rankfall.Analysis.Signature;
import rankfall.Analysis.Stratum;
import rankfall.Analysis.StructureEntry;
import rankfall.Analysis.Unfollowed;
import rankfall.ScanCount;
import rankfall.ScanCounts;
import rankfall.SignCondition;
import rankfall.exact.Polynomial;
import rankfall.exact.Rationals;
import rankfall.spec.Spec;

/** The image of an analysis as JSON; the resource {@code result-schema.json} documents it. */
final class JsonFile {
  private static final JsonNodeFactory NODES = JsonNodeFactory.instance;

  private JsonFile() {}

  /** {@code result.json}, ended by a line feed. */
  static String of(Analysis a) {
    DefaultIndenter indent = new DefaultIndenter("  ", "\n");
    DefaultPrettyPrinter printer =
        new DefaultPrettyPrinter().withObjectIndenter(indent).withArrayIndenter(indent);
    try {
      return new ObjectMapper().writer(printer).writeValueAsString(tree(a)) + "\n";
    } catch (JsonProcessingException e) {
      throw new UncheckedIOException("a tree cannot be written", e);
    }
  }

  private static ObjectNode tree(Analysis a) {
    ObjectNode out = NODES.objectNode();
    out.put("format", 1);
    out.set("program", NODES.objectNode().put("name", "rankfall").put("version", a.version()));
    out.set("spec", spec(a.spec()));
    out.put("status", word(a.status()));
    out.put("message", a.message());
    out.set("remarks", texts(a.remarks()));
    out.set("undecided", texts(a.undecided()));
    Contents contents = Contents.of(a);
    if (a.findings().isPresent()) {
      out.set("findings", findings(a.findings().get(), contents));
    } else {
      out.putNull("findings");
    }
    return out;
  }

  private static ObjectNode spec(Spec s) {
    ObjectNode out = NODES.objectNode();
    out.put("family", s.family());
    out.put("title", s.title().orElse(""));
    out.put("notes", s.notes().orElse(""));
    out.put("sha256", s.source().sha256());
    out.put("ground", word(s.ground()));
    out.put("convention", word(s.convention()));
    out.put("presentation", s.presentation() instanceof Spec.Matrices ? "matrices" : "brackets");
    out.set("generators", texts(s.presentation().generators()));
    out.set("parameters", texts(s.parameters()));
    out.set("where", texts(s.where().stream().map(Spec.Condition::text).toList()));
    return out;
  }

  private static ObjectNode findings(Findings f, Contents contents) {
    ObjectNode out = NODES.objectNode();
    out.set("generators", texts(f.listed()));
    out.set("variables", texts(f.variables()));
    out.set(
        "relations",
        array(
            f.relations(),
            (node, r) -> {
              node.put("polynomial", r.polynomial().toString());
              node.set("factors", polynomials(r.factors()));
              node.put("origin", word(r.origin()));
            }));
    out.set("poles", polynomials(f.poles()));
    out.set("components", array(f.components(), JsonFile::component));
    if (contents.hasStrata()) {
      out.set("strata", array(f.strata(), JsonFile::stratum));
      out.set(
          "coverings",
          array(f.coverings(), (node, c) -> node.put("lower", c.lower()).put("upper", c.upper())));
    } else {
      out.putNull("strata").putNull("coverings");
    }
    if (contents.hasRegions()) {
      out.set("regions", array(f.regions(), JsonFile::region));
    } else {
      out.putNull("regions");
    }
    if (contents.hasStrata()) {
      out.set("contractions", array(f.contractions(), JsonFile::contraction));
    } else {
      out.putNull("contractions");
    }
    if (f.scan().isPresent()) {
      out.set("scan", scan(f.scan().get()));
    } else {
      out.putNull("scan");
    }
    return out;
  }

  private static ObjectNode scan(ScanCounts s) {
    ObjectNode out = NODES.objectNode();
    out.set(
        "axes",
        array(
            s.axes(),
            (node, a) -> {
              node.put("name", a.name());
              node.set("values", texts(a.values().stream().map(Rationals::text).toList()));
            }));
    out.set("counts", array(s.counts(), JsonFile::count));
    return out;
  }

  private static void count(ObjectNode out, ScanCount c) {
    out.put("status", c.status());
    out.put("stratum", c.stratum());
    out.put("region", c.region());
    out.put("rank", c.rank().isPresent() ? c.rank().getAsInt() : null);
    out.put("dimension", c.dimension().isPresent() ? c.dimension().getAsInt() : null);
    out.set("signature", c.signature().map(x -> (JsonNode) signature(x)).orElse(NODES.nullNode()));
    out.put("type", c.type());
    out.put("points", c.points());
  }

  private static void contraction(ObjectNode out, Contraction c) {
    out.put("stratum", c.stratum());
    out.put("component", c.component());
    out.put("outcome", Words.outcome(c.outcome()));
    out.put("reason", c.outcome() instanceof Unfollowed u ? u.reason() : null);
    out.put("dimension", c.basis().size());
    if (c.outcome() instanceof Contracted limit) {
      out.put("rank", limit.rank()).put("derived", limit.derived()).put("centre", limit.centre());
    } else {
      out.putNull("rank").putNull("derived").putNull("centre");
    }
    optional(
        out,
        "type",
        c.outcome() instanceof Contracted x ? x.type().map(AlgebraType::text) : Optional.empty());
    out.set("basis", texts(c.basis()));
    out.set("structure", structure(c.outcome().structure(), c.basis()));
  }

  private static ArrayNode structure(List<StructureEntry> entries, List<String> basis) {
    return array(
        entries,
        (node, s) ->
            node.put("left", basis.get(s.left()))
                .put("right", basis.get(s.right()))
                .put("target", basis.get(s.target()))
                .put("coefficient", s.coefficient().toString()));
  }

  private static void component(ObjectNode out, Component c) {
    List<String> basis = c.basis();
    out.put("number", c.number());
    out.set("equations", polynomials(c.equations()));
    out.put("parameter_dimension", c.parameterDimension());
    out.put("dimension", basis.size());
    out.set("basis", texts(basis));
    out.set("structure", structure(c.structure(), basis));
    out.set("killing", killing(c.killing(), basis));
    if (c.dual().isPresent()) {
      out.set("dual", entries(c.dual().get(), basis));
    } else {
      out.putNull("dual");
    }
    out.set("conditions", array(c.conditions(), JsonFile::condition));
    c.torus()
        .ifPresentOrElse(t -> out.set("torus", JsonForms.torus(t)), () -> out.putNull("torus"));
    c.casimir()
        .ifPresentOrElse(
            x -> out.set("casimir", JsonForms.casimir(x, basis)), () -> out.putNull("casimir"));
  }

  private static ObjectNode killing(Killing k, List<String> basis) {
    ObjectNode out = NODES.objectNode();
    out.set("entries", entries(k.entries(), basis));
    out.put("rank", k.rank());
    out.set("kernel", combinations(k.kernel(), basis));
    ArrayNode blocks = NODES.arrayNode();
    k.blocks().forEach(b -> blocks.add(texts(b.stream().map(basis::get).toList())));
    out.set("blocks", blocks);
    k.determinant()
        .ifPresentOrElse(
            d ->
                out.set(
                    "determinant",
                    NODES
                        .objectNode()
                        .put("numerator", d.numerator().toString())
                        .put("denominator", d.denominator().toString())),
            () -> out.putNull("determinant"));
    k.signature()
        .ifPresentOrElse(s -> out.set("signature", signature(s)), () -> out.putNull("signature"));
    return out;
  }

  private static void condition(ObjectNode out, Condition d) {
    out.set("equations", polynomials(d.equations()));
    out.put("multiplicity", d.multiplicity().orElse(null));
    out.put("rank", d.rank().orElse(null));
    out.put("kernel_dimension", d.kernelDimension().orElse(null));
    out.set("kernel", combinations(d.kernel(), d.basis()));
    out.put("real_points", word(d.realPoints()));
  }

  private static void stratum(ObjectNode out, Stratum s) {
    out.put("name", s.name());
    out.set("equations", polynomials(s.equations()));
    ArrayNode exclusions = NODES.arrayNode();
    s.exclusions().forEach(e -> exclusions.add(polynomials(e)));
    out.set("exclusions", exclusions);
    out.put("codimension", s.codimension());
    out.put("dimension", s.dimension());
    out.put("rank", s.rank());
    out.put("kernel_dimension", s.kernelDimension());
    out.put("derived", s.derived());
    out.put("centre", s.centre());
    out.put("radical", s.radical());
    out.put("nilradical", s.nilradical());
    out.put("class", s.kind());
    optional(out, "type", s.type());
    out.put("real_points", word(s.realPoints()));
    out.set("witness", point(s.witness()));
    out.set("basis", texts(s.basis()));
    out.set("kernel", combinations(s.kernel(), s.basis()));
    out.set("remarks", texts(s.remarks()));
    s.invariantForms()
        .ifPresentOrElse(
            f -> out.set("invariant_forms", JsonForms.invariantForms(f, s.basis())),
            () -> out.putNull("invariant_forms"));
  }

  private static void region(ObjectNode out, Region r) {
    out.put("stratum", r.stratum());
    out.put("name", r.name());
    out.set("conditions", texts(r.conditions().stream().map(SignCondition::toString).toList()));
    out.set("signature", signature(r.signature()));
    optional(out, "type", r.type().map(AlgebraType::text));
    out.set("otherNames", texts(r.type().map(AlgebraType::otherNames).orElse(List.of())));
    out.put("proof", CsvFiles.proof(r.exact()));
    out.set("witness", point(r.witness()));
  }

  private static ObjectNode signature(Signature s) {
    return NODES.objectNode().put("plus", s.plus()).put("minus", s.minus()).put("zero", s.zero());
  }

  private static ArrayNode entries(List<MatrixEntry> entries, List<String> basis) {
    return array(
        entries,
        (node, e) ->
            node.put("row", basis.get(e.row()))
                .put("column", basis.get(e.column()))
                .put("entry", e.value().toString()));
  }

  private static ArrayNode combinations(List<Combination> list, List<String> basis) {
    return array(
        list,
        (node, c) -> {
          for (int k = 0; k < c.coefficients().size(); k++) {
            if (!c.coefficients().get(k).isZero()) {
              node.put(basis.get(k), c.coefficients().get(k).toString());
            }
          }
        });
  }

  private static ObjectNode point(List<Coordinate> witness) {
    ObjectNode out = NODES.objectNode();
    witness.forEach(c -> out.put(c.variable(), c.value()));
    return out;
  }

  private static ArrayNode polynomials(List<Polynomial> list) {
    return texts(list.stream().map(Polynomial::toString).toList());
  }

  private static ArrayNode texts(List<String> list) {
    ArrayNode out = NODES.arrayNode();
    list.forEach(out::add);
    return out;
  }

  private static <T> ArrayNode array(List<T> list, BiConsumer<ObjectNode, T> fill) {
    ArrayNode out = NODES.arrayNode();
    for (T item : list) {
      ObjectNode node = NODES.objectNode();
      fill.accept(node, item);
      out.add(node);
    }
    return out;
  }

  private static void optional(ObjectNode out, String key, Optional<String> value) {
    value.ifPresentOrElse(v -> out.put(key, v), () -> out.putNull(key));
  }

  private static String word(Enum<?> value) {
    return value.name().toLowerCase(Locale.ROOT);
  }
}
