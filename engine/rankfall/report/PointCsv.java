package rankfall.report;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.stream.Collectors;
import org.apache.commons.csv.CSVFormat;
import rankfall.AlgebraType;
import rankfall.Analysis.Signature;
import rankfall.PointResult;

/** One CSV row a point (RFC 4180), a column a parameter, then the facts without the matrix. */
public final class PointCsv implements PointWriter {
  private static final List<String> FACTS =
      List.of(
          "generators",
          "dimension",
          "closed",
          "rank",
          "plus",
          "minus",
          "zero",
          "determinant",
          "derived_series",
          "lower_central_series",
          "centre",
          "radical",
          "nilradical",
          "unimodular",
          "invariant_forms",
          "invariant_forms_maximal_rank",
          "abelian",
          "nilpotent",
          "solvable",
          "semisimple",
          "reductive",
          "compact",
          "stratum",
          "type",
          "error");

  private final List<String> names;

  /**
   * Answers of one family.
   *
   * @param names of parameters and functions, in the order of the columns
   */
  public PointCsv(List<String> names) {
    this.names = List.copyOf(names);
  }

  @Override
  public String head() {
    List<String> header = new ArrayList<>(names);
    header.addAll(FACTS);
    return line(header);
  }

  @Override
  public String text(PointResult result) {
    List<String> cells = new ArrayList<>();
    names.forEach(n -> cells.add(result.parameters().getOrDefault(n, "")));
    if (result instanceof PointResult.Facts facts) {
      facts(cells, facts);
    } else {
      PointResult.Failure failure = (PointResult.Failure) result;
      cells.add(Integer.toString(failure.generators()));
      cells.add(failure.open() ? Integer.toString(failure.dimension().getAsInt()) : "");
      cells.add(failure.open() ? "false" : "");
      cells.addAll(Collections.nCopies(FACTS.size() - 4, ""));
      cells.add(failure.error());
    }
    return line(cells);
  }

  private static void facts(List<String> cells, PointResult.Facts f) {
    add(cells, f.generators(), f.dimension(), true, f.killing().rank());
    if (f.killing().signature().isPresent()) {
      Signature s = f.killing().signature().get();
      add(cells, s.plus(), s.minus(), s.zero());
    } else {
      add(cells, "", "", "");
    }
    add(cells, f.killing().determinant());
    add(cells, series(f.derivedSeries()), series(f.lowerCentralSeries()));
    add(cells, f.centre(), f.radical(), f.nilradical(), f.unimodular());
    add(cells, f.invariantForms().dimension());
    add(cells, f.invariantForms().maximal() ? f.invariantForms().rank() : "");
    add(cells, f.abelian(), f.nilpotent(), f.solvable());
    add(cells, f.semisimple(), f.reductive(), f.compact());
    add(cells, f.stratum().orElse(""));
    add(cells, f.type().map(AlgebraType::name).orElse(""), "");
  }

  private static void add(List<String> cells, Object... values) {
    for (Object value : values) {
      cells.add(value.toString());
    }
  }

  private static String series(List<Integer> dimensions) {
    return dimensions.stream().map(d -> Integer.toString(d)).collect(Collectors.joining("; "));
  }

  private static String line(List<String> cells) {
    return CSVFormat.RFC4180.format(cells.toArray()) + "\r\n";
  }
}
