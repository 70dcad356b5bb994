package rankfall.report;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;
import rankfall.Analysis.Signature;
import rankfall.PointResult;

/** A short text a point, for a person. */
public final class PointText implements PointWriter {
  private static final String MARGIN = "  ";
  private static final int LABEL = 22;

  /** Answers one below the other, an empty line after each. */
  public PointText() {}

  @Override
  public String head() {
    return "";
  }

  @Override
  public String text(PointResult result) {
    List<String> lines = new ArrayList<>();
    lines.add(result.family() + point(result));
    if (result instanceof PointResult.Facts facts) {
      lines.addAll(facts(facts));
    } else {
      lines.add(MARGIN + "no answer: " + ((PointResult.Failure) result).error());
    }
    return String.join("\n", lines) + "\n\n";
  }

  private static String point(PointResult result) {
    return result.parameters().isEmpty()
        ? ""
        : result.parameters().entrySet().stream()
            .map(e -> e.getKey() + " = " + e.getValue())
            .collect(Collectors.joining(", ", " at ", ""));
  }

  private static List<String> facts(PointResult.Facts f) {
    List<String> out = new ArrayList<>();
    out.add(line("dimension", f.dimension() + " from " + generators(f.generators())));
    out.add(line("Killing form", "rank " + f.killing().rank() + signature(f.killing())));
    out.add(line("determinant", f.killing().determinant()));
    List<String> rows = matrix(f.killing().matrix());
    for (int k = 0; k < rows.size(); k++) {
      out.add(line(k == 0 ? "matrix" : "", rows.get(k)));
    }
    out.add(line("derived series", series(f.derivedSeries())));
    out.add(line("lower central series", series(f.lowerCentralSeries())));
    out.add(line("centre", Integer.toString(f.centre())));
    out.add(line("radical", Integer.toString(f.radical())));
    out.add(line("nilradical", Integer.toString(f.nilradical())));
    out.add(line("invariant forms", forms(f.invariantForms())));
    out.add(line("properties", properties(f)));
    f.stratum().ifPresent(s -> out.add(line("stratum", s)));
    f.type().ifPresent(t -> out.add(line("type", t.name())));
    f.type()
        .filter(t -> !t.otherNames().isEmpty())
        .ifPresent(t -> out.add(line("also called", String.join(", ", t.otherNames()))));
    return out;
  }

  private static String line(String label, String text) {
    return MARGIN + label + " ".repeat(LABEL - label.length()) + text;
  }

  private static String generators(int count) {
    return count + (count == 1 ? " generator" : " generators");
  }

  private static String signature(PointResult.Killing k) {
    if (k.signature().isEmpty()) {
      return "; no signature over the complex numbers";
    }
    Signature s = k.signature().get();
    return ": " + s.plus() + " positive, " + s.minus() + " negative, " + s.zero() + " zero";
  }

  /** Rows with their columns aligned to the right. */
  private static List<String> matrix(List<List<String>> matrix) {
    int n = matrix.size();
    int[] widths = new int[n];
    for (List<String> row : matrix) {
      for (int j = 0; j < n; j++) {
        widths[j] = Math.max(widths[j], row.get(j).length());
      }
    }
    List<String> out = new ArrayList<>();
    for (List<String> row : matrix) {
      StringBuilder text = new StringBuilder();
      for (int j = 0; j < n; j++) {
        text.append(j == 0 ? "" : "  ");
        text.append(" ".repeat(widths[j] - row.get(j).length())).append(row.get(j));
      }
      out.add(text.toString());
    }
    return out;
  }

  private static String series(List<Integer> dimensions) {
    return dimensions.stream().map(d -> Integer.toString(d)).collect(Collectors.joining(" > "));
  }

  private static String forms(PointResult.InvariantForms f) {
    return f.dimension() + ", the greatest rank " + (f.maximal() ? "" : "at least ") + f.rank();
  }

  private static String properties(PointResult.Facts f) {
    List<String> out = new ArrayList<>();
    add(out, f.abelian(), "abelian");
    add(out, f.nilpotent(), "nilpotent");
    add(out, f.solvable(), "solvable");
    add(out, f.semisimple(), "semisimple");
    add(out, f.reductive(), "reductive");
    add(out, f.compact(), "compact");
    add(out, f.unimodular(), "unimodular");
    return out.isEmpty() ? "none of the usual ones" : String.join(", ", out);
  }

  private static void add(List<String> words, boolean holds, String word) {
    if (holds) {
      words.add(word);
    }
  }
}
