package rankfall.spec;

import java.util.ArrayList;
import java.util.Iterator;
import java.util.List;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.snakeyaml.engine.v2.api.LoadSettings;
import org.snakeyaml.engine.v2.api.lowlevel.Parse;
import org.snakeyaml.engine.v2.events.Event;
import org.snakeyaml.engine.v2.exceptions.Mark;
import org.snakeyaml.engine.v2.exceptions.MarkedYamlEngineException;
import org.snakeyaml.engine.v2.exceptions.YamlEngineException;

/**
 * Cuts a file into YAML documents. Where the syntax of one breaks, reading goes on at the next line
 * that begins with {@code ---}: inside a document such a line cannot be content.
 */
final class YamlReader {
  /** So many broken documents are told apart; the rest of the file is then left alone. */
  private static final int MAX_BROKEN = 100;

  private static final Pattern FAMILY_LINE =
      Pattern.compile("(?:---\\s+)?family:\\s+[\"']?([a-z0-9][a-z0-9-]{0,63})[\"']?\\s*(?:#.*)?");

  private final FileText file;
  private final List<YamlDocument> documents = new ArrayList<>();
  private int broken;

  private YamlReader(FileText file) {
    this.file = file;
  }

  static List<YamlDocument> documents(FileText file) {
    YamlReader reader = new YamlReader(file);
    int line = 0;
    while (line < file.lineCount() && reader.broken < MAX_BROKEN) {
      line = reader.readFrom(line);
    }
    return List.copyOf(reader.documents);
  }

  /** Reads up to the end or to a broken document; returns the line to go on from. */
  private int readFrom(int firstLine) {
    LoadSettings settings = LoadSettings.builder().setCodePointLimit(Integer.MAX_VALUE).build();
    int start = firstLine;
    try {
      Iterator<Event> events = new Parse(settings).parseString(file.from(firstLine)).iterator();
      YamlComposer composer = new YamlComposer(file, firstLine, events);
      while (composer.findDocument()) {
        start = composer.documentLine();
        documents.add(new YamlDocument.Tree(composer.document()));
        start = Math.min(composer.lastLine(), file.lineCount() - 1);
      }
      return file.lineCount();
    } catch (SpecFault fault) {
      return breakOff(start, fault);
    } catch (MarkedYamlEngineException e) {
      return breakOff(start, syntaxFault(e, firstLine));
    } catch (YamlEngineException e) {
      return breakOff(
          start, SpecFault.of(file.place(start, 0, 1), "not YAML 1.2: " + oneLine(e.getMessage())));
    }
  }

  private int breakOff(int documentLine, SpecFault fault) {
    broken++;
    int faultLine = Math.max(documentLine, fault.place().line() - 1);
    int next = opensDocument(faultLine) && faultLine > documentLine ? faultLine : faultLine + 1;
    while (next < file.lineCount() && !opensDocument(next)) {
      next++;
    }
    documents.add(
        new YamlDocument.Broken(familyBetween(documentLine, next), file.diagnostic(fault)));
    return next;
  }

  private Optional<String> familyBetween(int from, int to) {
    return file.lines().subList(from, to).stream()
        .map(FAMILY_LINE::matcher)
        .filter(Matcher::matches)
        .map(matcher -> matcher.group(1))
        .findFirst();
  }

  private boolean opensDocument(int line) {
    return file.lines().get(line).startsWith("---");
  }

  private SpecFault syntaxFault(MarkedYamlEngineException e, int firstLine) {
    Optional<Mark> mark = e.getProblemMark().or(e::getContextMark);
    Place place =
        mark.map(m -> file.place(m.getLine() + firstLine, m.getColumn(), 1))
            .orElse(file.place(firstLine, 0, 1));
    if (isTab(place)) {
      return SpecFault.of(place, "a tab stands where YAML wants spaces", "indent with spaces");
    }
    String cause = "not YAML: " + oneLine(e.getProblem());
    if (file.lines().get(place.line() - 1).matches("\\s*brackets:\\s*\\[.*")) {
      return SpecFault.of(
          place, cause, "write 'brackets: |' and the equations on the lines below, indented");
    }
    return SpecFault.of(place, cause, "check indentation, quotes and brackets up to here");
  }

  private boolean isTab(Place place) {
    int column = place.column() - 1;
    return column < file.lengthOf(place.line() - 1) && file.at(place.line() - 1, column) == '\t';
  }

  private static String oneLine(String message) {
    return message.strip().replaceAll("\\s+", " ");
  }
}
