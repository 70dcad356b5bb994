package rankfall.cli;

import java.io.IOException;
import java.io.Reader;
import java.util.Collection;
import java.util.Iterator;
import java.util.Map;
import java.util.Optional;
import org.apache.commons.numbers.fraction.BigFraction;
import rankfall.PointResult;
import rankfall.Points;
import rankfall.cli.FrontDoors.Answer;
import rankfall.cli.FrontDoors.PointAnswers;
import rankfall.report.PointTable;
import rankfall.report.PointWriter;

/**
 * Answers of the program itself.
 *
 * @param points the family
 * @param writer the form of the answers
 */
record ProgramPoints(Points points, PointWriter writer) implements PointAnswers {
  @Override
  public String head() {
    return writer.head();
  }

  @Override
  public Optional<String> misfit(Collection<String> names) {
    return points.misfit(names);
  }

  @Override
  public Answer at(Map<String, BigFraction> point) {
    return answer(points.at(point));
  }

  @Override
  public Iterator<Answer> atEach(Reader table) throws IOException {
    Iterator<PointResult> results = PointTable.answers(points, table);
    return new Iterator<>() {
      @Override
      public boolean hasNext() {
        return results.hasNext();
      }

      @Override
      public Answer next() {
        return answer(results.next());
      }
    };
  }

  private Answer answer(PointResult result) {
    return new Answer(writer.text(result), result instanceof PointResult.Facts);
  }
}
