package rankfall.report;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayDeque;
import java.util.Deque;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import rankfall.Analysis;
import rankfall.Analysis.Status;

class LatexAppendixTest {
  @ParameterizedTest
  @CsvSource(
      delimiter = '~',
      quoteCharacter = '`',
      value = {
        "50% & $x_1$ #2~50\\% \\& \\$x\\_1\\$ \\#2",
        "{a^b}\\c~\\{a\\textasciicircum{}b\\}\\textbackslash{}c",
        "<script>~\\ensuremath{<}script\\ensuremath{>}",
        "\u03b1 and \u03a9~\\ensuremath{\\alpha} and \\ensuremath{\\Omega}",
        "Poincar\u00e9, M\u00f6bius, \u0141ojasiewicz~Poincar\\'{e}, M\\\"{o}bius, \\L{}ojasiewicz",
        "\u4e2d \u2013 \u2264~{[}U+4E2D{]} -- \\ensuremath{\\leq}",
      })
  void plainTextIsEscaped(String plain, String latex) {
    assertEquals(latex, LatexText.escape(plain));
  }

  @Test
  void titleOfASpecCannotRunCommands() {
    String tex =
        LatexAppendix.of(SampleAnalyses.scaled(Status.COMPLETE, "\\input{x} % $ & _ ^ {", ""));
    assertTrue(
        tex.contains(
            "\\section{\\textbackslash{}input\\{x\\} \\% \\$ \\& \\_ \\textasciicircum{} \\{}"));
    assertFalse(tex.contains("\\input{x}"));
  }

  @ParameterizedTest
  @MethodSource("rankfall.report.HtmlPageTest#samples")
  void everyGroupAndEnvironmentIsClosedAndAllIsAscii(Analysis a) {
    String tex = LatexAppendix.of(a);
    assertTrue(tex.chars().allMatch(c -> c < 128));
    Deque<String> open = new ArrayDeque<>();
    Matcher m = Pattern.compile("\\\\begin\\{(\\w+)}|\\\\end\\{(\\w+)}|\\\\.|[{}]").matcher(tex);
    while (m.find()) {
      if (m.group(1) != null) {
        open.push(m.group(1));
      } else if (m.group(2) != null) {
        assertEquals(m.group(2), open.pop());
      } else if (m.group().equals("{")) {
        open.push("{");
      } else if (m.group().equals("}")) {
        assertEquals("{", open.pop());
      }
    }
    assertTrue(open.isEmpty());
  }

  @Test
  void smallMatrixIsSetAsOneLargeOneByItsEntries() {
    String small = LatexAppendix.of(SampleAnalyses.scaled());
    assertTrue(
        small.contains(
            "K = \\begin{pmatrix}\n8 & 0 & 0 \\\\\n0 & 0 & \\frac{4\\alpha}{b_{1}} \\\\\n"
                + "0 & \\frac{4\\alpha}{b_{1}} & 0\n\\end{pmatrix}"));
    assertTrue(small.contains("$\\det K = -\\frac{128\\alpha^{2}}{b_{1}^{2}}$"));
    String large = LatexAppendix.of(LargeAnalyses.large(15));
    assertFalse(large.contains("pmatrix"));
    assertTrue(large.contains("Non-zero entries of the Killing matrix"));
  }

  @Test
  void bracketsConditionsStrataAndRegionsAreTables() {
    String tex = LatexAppendix.of(SampleAnalyses.stratified());
    assertTrue(tex.contains("$[X, Z] = -bY$"));
    assertTrue(tex.contains("\\raggedright $a = 0$ &\n\\raggedright 2 &\n\\raggedright 1 &\n"));
    assertTrue(tex.contains("\\raggedright except where $b = 0$ \\tabularnewline\n"));
    assertTrue(tex.contains("\\raggedright or where $c = 0$ \\tabularnewline\n"));
    assertTrue(tex.contains("\\raggedright Kernel: "));
    assertTrue(tex.contains("\\raggedright Point: "));
    assertTrue(tex.contains("No limit: these brackets of the general point have none."));
    assertTrue(tex.contains("$a > 0,\\; \\allowbreak 2a^{2} - bc > 0$"));
    assertTrue(tex.contains("\\raggedright sampled"));
  }
}
