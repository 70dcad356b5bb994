package rankfall.cli;

import java.io.IOException;
import java.io.Reader;
import java.nio.file.Path;
import java.util.Collection;
import java.util.Iterator;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.apache.commons.numbers.fraction.BigFraction;
import rankfall.Analysis;
import rankfall.Budget;
import rankfall.spec.Spec;
import rankfall.spec.SpecException;
import rankfall.spec.SpecResult;

/** What the verbs ask of the other rooms. */
interface FrontDoors {
  /** Reads all documents of a file, in order. */
  List<SpecResult> read(Path file) throws IOException;

  /** The JSON schema of the spec format, ending with a line feed. */
  String schema();

  /** Starts to load what an analysis needs, without waiting for it. */
  void warmUp();

  /** Analyses one family; called on several threads at once. */
  Analysis analyse(Spec spec, Budget budget) throws SpecException;

  /** Writes the folder of one family; called on several threads at once. */
  void writeFamily(Path out, Analysis analysis) throws IOException;

  /** Writes the table over all families, in the order of the outcomes. */
  void writeSummary(Path out, List<Outcome> outcomes) throws IOException;

  /** Prepares a family to be asked at points. */
  PointAnswers points(Spec spec, PointForm form) throws SpecException;

  /**
   * Scans a family.
   *
   * @param spec of the family
   * @param order what is asked for
   * @param progress hears of points
   * @param messages hears of what is not complete
   * @return what is said of the scan
   * @throws SpecException if the spec describes no family
   * @throws IllegalArgumentException if the points do not fit the family; the message is for the
   *     user
   * @throws IOException if a file cannot be read or written; rows written so far are whole
   * @throws InterruptedException if this thread is interrupted
   */
  Scanned scan(Spec spec, ScanOrder order, ScanProgress progress, Messages messages)
      throws SpecException, IOException, InterruptedException;

  /**
   * What is said of a scan.
   *
   * @param table for standard output; empty where a file was written
   * @param message a line for the user
   * @param good false where some point could not be read
   */
  record Scanned(String table, String message, boolean good) {}

  /** How the answer to a point is written. */
  enum PointForm {
    TEXT,
    JSON,
    CSV
  }

  /** One family, ready to be asked at points. */
  interface PointAnswers {
    /** What stands before the first answer: the header row of a table, else nothing. */
    String head();

    /**
     * Why values under some names determine no point.
     *
     * @param names of the values given
     * @return one line for the user; empty if they determine a point
     */
    Optional<String> misfit(Collection<String> names);

    /** The answer at one point. */
    Answer at(Map<String, BigFraction> point);

    /**
     * Answers each row of a table whose header names the parameters.
     *
     * @param table the text of the table; its header is read at once, each row when its answer is
     *     asked for
     * @return the answers in the order of the rows; a row that cannot be read gets an answer that
     *     says so; throws {@link java.io.UncheckedIOException} if the table cannot be read on
     * @throws IOException if the table cannot be read
     * @throws IllegalArgumentException if the header does not fit; the message is for the user
     */
    Iterator<Answer> atEach(Reader table) throws IOException;
  }

  /**
   * What is said of a point.
   *
   * @param text whole lines, each with its line feed
   * @param good false where it is an error instead of facts
   */
  record Answer(String text, boolean good) {}
}
