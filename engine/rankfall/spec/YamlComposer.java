package rankfall.spec;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.Iterator;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.snakeyaml.engine.v2.common.Anchor;
import org.snakeyaml.engine.v2.events.AliasEvent;
import org.snakeyaml.engine.v2.events.CollectionStartEvent;
import org.snakeyaml.engine.v2.events.DocumentStartEvent;
import org.snakeyaml.engine.v2.events.Event;
import org.snakeyaml.engine.v2.events.MappingStartEvent;
import org.snakeyaml.engine.v2.events.NodeEvent;
import org.snakeyaml.engine.v2.events.ScalarEvent;
import org.snakeyaml.engine.v2.exceptions.Mark;

/** Builds nodes from parse events; depth and the nodes that aliases repeat are bounded. */
final class YamlComposer {
  /** Lists and mappings may be nested so deep. */
  static final int MAX_DEPTH = 200;

  /** Aliases may repeat so many nodes in one document. */
  static final int MAX_REPEATED = 100_000;

  private static final String CORE_TAGS = "tag:yaml.org,2002:";

  /** A node and the number of nodes in it, repeated ones counted each time. */
  private record Counted(YamlNode node, int size) {}

  private final FileText file;
  private final int lineShift;
  private final Iterator<Event> events;
  private final Map<Anchor, Counted> anchors = new HashMap<>();
  private int documentLine;
  private int lastLine;
  private int repeated;

  YamlComposer(FileText file, int lineShift, Iterator<Event> events) {
    this.file = file;
    this.lineShift = lineShift;
    this.events = events;
  }

  /** Moves to the next document; false at the end of the stream. */
  boolean findDocument() {
    while (events.hasNext()) {
      Event event = next();
      if (event instanceof DocumentStartEvent) {
        documentLine = place(event).line() - 1;
        return true;
      }
    }
    return false;
  }

  /** The line the document found starts in, from 0. */
  int documentLine() {
    return documentLine;
  }

  private Event next() {
    Event event = events.next();
    lastLine = event.getEndMark().orElseThrow().getLine() + lineShift;
    return event;
  }

  /** The line up to which the text was used, from 0. */
  int lastLine() {
    return lastLine;
  }

  /** The root of the document found. */
  YamlNode document() {
    anchors.clear();
    repeated = 0;
    return node(next(), 0).node();
  }

  private Counted node(Event event, int depth) {
    if (event instanceof AliasEvent alias) {
      return repeat(alias);
    }
    Counted counted;
    if (event instanceof ScalarEvent scalar) {
      counted = new Counted(new YamlNode.Text(scalar(scalar)), 1);
    } else {
      if (depth >= MAX_DEPTH) {
        throw SpecFault.of(place(event), "lists and mappings nested over " + MAX_DEPTH + " deep");
      }
      counted = event instanceof MappingStartEvent ? mapping(event, depth) : sequence(event, depth);
    }
    checkTag(event);
    Optional<Anchor> anchor = ((NodeEvent) event).getAnchor();
    if (anchor.isPresent()) {
      anchors.put(anchor.get(), counted);
    }
    return counted;
  }

  private Counted repeat(AliasEvent alias) {
    Place place = place(alias);
    Counted target = anchors.get(alias.getAlias());
    if (target == null) {
      throw SpecFault.of(
          place, "alias '*" + alias.getAlias() + "' has no complete anchor before it");
    }
    repeated += target.size();
    if (repeated > MAX_REPEATED) {
      throw SpecFault.of(
          place,
          "aliases repeat more than " + MAX_REPEATED + " values",
          "write the document without so many aliases");
    }
    return target;
  }

  private Counted sequence(Event start, int depth) {
    List<YamlNode> items = new ArrayList<>();
    int size = 1;
    Event event = next();
    while (event.getEventId() != Event.ID.SequenceEnd) {
      Counted item = node(event, depth + 1);
      items.add(item.node());
      size += item.size();
      event = next();
    }
    return new Counted(new YamlNode.Sequence(items, place(start, event)), size);
  }

  private Counted mapping(Event start, int depth) {
    List<YamlNode.Entry> entries = new ArrayList<>();
    int size = 1;
    Event event = next();
    while (event.getEventId() != Event.ID.MappingEnd) {
      Counted key = node(event, depth + 1);
      Counted value = node(next(), depth + 1);
      if (!(key.node() instanceof YamlNode.Text text)) {
        throw SpecFault.of(key.node().place(), "a key is to be a name, not " + key.node().kind());
      }
      entries.add(new YamlNode.Entry(text.text(), value.node()));
      size += key.size() + value.size();
      event = next();
    }
    return new Counted(new YamlNode.Mapping(entries, place(start, event)), size);
  }

  private void checkTag(Event event) {
    Optional<String> tag =
        event instanceof ScalarEvent scalar
            ? scalar.getTag()
            : ((CollectionStartEvent) event).getTag();
    if (tag.isPresent() && !tag.get().startsWith(CORE_TAGS) && !tag.get().equals("!")) {
      throw SpecFault.of(place(event), "tag '" + tag.get() + "' is not known", "leave it out");
    }
  }

  private ScalarText scalar(ScalarEvent event) {
    Mark start = event.getStartMark().orElseThrow();
    ScalarText.Style style =
        switch (event.getScalarStyle()) {
          case SINGLE_QUOTED -> ScalarText.Style.SINGLE_QUOTED;
          case DOUBLE_QUOTED -> ScalarText.Style.DOUBLE_QUOTED;
          case LITERAL, FOLDED -> ScalarText.Style.BLOCK;
          default -> ScalarText.Style.PLAIN;
        };
    return new ScalarText(
        file,
        event.getValue(),
        style,
        place(event, event),
        start.getLine() + lineShift,
        start.getColumn());
  }

  private Place place(Event event) {
    Mark start = event.getStartMark().orElseThrow();
    return file.place(start.getLine() + lineShift, start.getColumn(), 1);
  }

  /** From the start of one event to the end of another, or to the end of the first line. */
  private Place place(Event first, Event last) {
    Mark start = first.getStartMark().orElseThrow();
    Mark end = last.getEndMark().orElseThrow();
    int line = start.getLine() + lineShift;
    int length =
        start.getLine() == end.getLine() ? end.getColumn() - start.getColumn() : Integer.MAX_VALUE;
    return file.place(line, start.getColumn(), length);
  }
}
