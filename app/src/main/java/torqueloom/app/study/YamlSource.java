package torqueloom.app.study;

import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Optional;
import org.snakeyaml.engine.v2.api.LoadSettings;
import org.snakeyaml.engine.v2.api.lowlevel.Compose;
import org.snakeyaml.engine.v2.api.lowlevel.Parse;
import org.snakeyaml.engine.v2.events.AliasEvent;
import org.snakeyaml.engine.v2.events.CollectionStartEvent;
import org.snakeyaml.engine.v2.events.Event;
import org.snakeyaml.engine.v2.events.NodeEvent;
import org.snakeyaml.engine.v2.events.ScalarEvent;
import org.snakeyaml.engine.v2.exceptions.Mark;
import org.snakeyaml.engine.v2.exceptions.MarkedYamlEngineException;
import org.snakeyaml.engine.v2.exceptions.YamlEngineException;
import org.snakeyaml.engine.v2.nodes.MappingNode;
import org.snakeyaml.engine.v2.nodes.Node;

/**
 * Text of a study file as a tree of YAML nodes with their places. Only plain data pass: no tags, no
 * anchors and aliases, a bounded size and depth, so that a file from a stranger can do no harm.
 */
final class YamlSource {
  /** Largest study file (bytes); a complete study has about 5,000. */
  static final int MAXIMUM_BYTES = 1 << 20;

  /** Deepest nesting; the schema needs 6. */
  static final int MAXIMUM_DEPTH = 20;

  private YamlSource() {}

  /**
   * Reads a file.
   *
   * @param path where it stands
   * @param shown the file as the user named it
   * @throws StudyException if it cannot be read or is no YAML mapping
   */
  static MappingNode read(Path path, String shown) throws StudyException {
    final String text = decode(bytes(path, shown), shown);
    if (text.isBlank()) {
      throw bad(shown, "the file is empty; a study is needed, see: torqueloom new DIR");
    }
    final LoadSettings settings = LoadSettings.builder().setLabel(shown).setUseMarks(true).build();
    try {
      refuseSpecialNodes(settings, text, shown);
      final Optional<Node> root = new Compose(settings).composeString(text);
      return mapping(root, shown);
    } catch (MarkedYamlEngineException e) {
      throw notYaml(e, shown);
    } catch (YamlEngineException e) {
      throw bad(shown, "not readable as YAML: " + firstLine(e.getMessage()));
    }
  }

  private static byte[] bytes(Path path, String shown) throws StudyException {
    if (!Files.exists(path)) {
      throw bad(shown, "no such file");
    }
    if (!Files.isRegularFile(path)) {
      throw bad(shown, "is not a file; a study file is needed");
    }
    try {
      if (Files.size(path) > MAXIMUM_BYTES) {
        throw bad(
            shown, "has " + Files.size(path) + " bytes; a study has at most " + MAXIMUM_BYTES);
      }
      return Files.readAllBytes(path);
    } catch (IOException e) {
      throw bad(shown, "cannot be read: " + reason(e));
    }
  }

  private static String decode(byte[] bytes, String shown) throws StudyException {
    try {
      final String text =
          StandardCharsets.UTF_8.newDecoder().decode(ByteBuffer.wrap(bytes)).toString();
      return text.startsWith("\uFEFF") ? text.substring(1) : text;
    } catch (CharacterCodingException e) {
      throw bad(shown, "is not text in UTF-8; a study is a YAML file in UTF-8");
    }
  }

  private static void refuseSpecialNodes(LoadSettings settings, String text, String shown)
      throws StudyException {
    int depth = 0;
    for (final Event event : new Parse(settings).parseString(text)) {
      if (event instanceof CollectionStartEvent) {
        depth++;
      } else if (event.getEventId() == Event.ID.MappingEnd
          || event.getEventId() == Event.ID.SequenceEnd) {
        depth--;
      }
      if (depth > MAXIMUM_DEPTH) {
        throw at(event, shown, "nested more than " + MAXIMUM_DEPTH + " deep");
      }
      if (event instanceof NodeEvent node) {
        refuseSpecialNode(node, shown);
      }
    }
  }

  private static void refuseSpecialNode(NodeEvent event, String shown) throws StudyException {
    if (event instanceof AliasEvent || event.getAnchor().isPresent()) {
      throw at(
          event, shown, "anchors (&) and aliases (*) are not used in studies; write the value");
    }
    final boolean tagged =
        event instanceof ScalarEvent scalar && scalar.getTag().isPresent()
            || event instanceof CollectionStartEvent start && start.getTag().isPresent();
    if (tagged) {
      throw at(event, shown, "tags (!) are not used in studies; write the plain value");
    }
  }

  private static MappingNode mapping(Optional<Node> root, String shown) throws StudyException {
    if (root.isEmpty()) {
      throw bad(shown, "the file holds no value; a study is needed, see: torqueloom new DIR");
    }
    if (root.get() instanceof MappingNode mapping) {
      return mapping;
    }
    throw bad(shown, "is not a study: keys with values are needed, beginning with torqueloom: 1");
  }

  private static StudyException notYaml(MarkedYamlEngineException e, String shown) {
    final Optional<Mark> mark = e.getProblemMark().or(e::getContextMark);
    final String context = e.getContext() == null ? "" : ", " + firstLine(e.getContext());
    final String text = "not readable as YAML: " + firstLine(e.getProblem()) + context;
    return new StudyException(
        new Problem(
            shown,
            mark.map(m -> m.getLine() + 1).orElse(0),
            mark.map(m -> m.getColumn() + 1).orElse(0),
            "",
            text));
  }

  private static StudyException at(Event event, String shown, String text) {
    final int line = event.getStartMark().map(m -> m.getLine() + 1).orElse(0);
    final int column = event.getStartMark().map(m -> m.getColumn() + 1).orElse(0);
    return new StudyException(new Problem(shown, line, column, "", text));
  }

  private static StudyException bad(String shown, String text) {
    return new StudyException(Problem.ofFile(shown, text));
  }

  private static String reason(IOException e) {
    return e instanceof java.nio.file.AccessDeniedException
        ? "permission denied"
        : firstLine(String.valueOf(e.getMessage()));
  }

  private static String firstLine(String text) {
    if (text == null) {
      return "unknown fault";
    }
    final int end = text.indexOf('\n');
    return end < 0 ? text : text.substring(0, end);
  }
}
