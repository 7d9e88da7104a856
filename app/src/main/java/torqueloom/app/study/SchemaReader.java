package torqueloom.app.study;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.stream.Collectors;
import org.snakeyaml.engine.v2.common.FlowStyle;
import org.snakeyaml.engine.v2.exceptions.Mark;
import org.snakeyaml.engine.v2.nodes.MappingNode;
import org.snakeyaml.engine.v2.nodes.Node;
import org.snakeyaml.engine.v2.nodes.NodeTuple;
import org.snakeyaml.engine.v2.nodes.ScalarNode;
import org.snakeyaml.engine.v2.nodes.SequenceNode;

/**
 * Reads the nodes of a study as the schema says: every value that fits is kept, every fault is noted,
 * defaults are filled in. One reader reads one file.
 */
final class SchemaReader {
  private final Use goal;
  private final Faults faults;
  private final Values values;
  private final List<String> notices = new ArrayList<>();
  private final Map<String, String> copies = new LinkedHashMap<>();
  private final Map<String, ValueType.Deviation> deviations = new LinkedHashMap<>();

  /**
   * @param goal last stage wanted: keys of later stages need not stand
   * @param faults where faults are noted
   * @param values where values are put
   */
  SchemaReader(Use goal, Faults faults, Values values) {
    this.goal = goal;
    this.faults = faults;
    this.values = values;
  }

  /** Reads a whole study; returns notices on keys that this version does not use. */
  List<String> read(MappingNode root) {
    section("", root, StudySchema.root());
    resolveCopies();
    resolveDeviations();
    return notices;
  }

  private void section(String path, MappingNode node, ValueType.Section section) {
    final Set<String> meant = new HashSet<>();
    final Map<String, Node> given = givenKeys(path, node, section, meant);
    if (refusedKind(path, section, given)) {
      return;
    }
    for (final Key key : section.keys()) {
      final String name = path.isEmpty() ? key.name() : path + "." + key.name();
      final Node value = given.get(key.name());
      if (value == null && meant.contains(key.name())) {
        continue; // a misspelt key is one fault, not two
      } else if (value == null) {
        absent(name, key);
      } else {
        noticeLater(name, key, path);
        value(name, value, key.type());
      }
    }
  }

  /** A kind of a later version brings keys of its own: only the kind is reported then. */
  private boolean refusedKind(String path, ValueType.Section section, Map<String, Node> given) {
    for (final Key key : section.keys()) {
      if (key.name().equals("kind")
          && key.type() instanceof ValueType.Choice choice
          && given.get("kind") instanceof ScalarNode scalar
          && choice.later().contains(scalar.getValue())) {
        value(path + ".kind", scalar, choice);
        return true;
      }
    }
    return false;
  }

  /** The known keys that stand in a block; misspelt ones are noted and their meaning collected. */
  private Map<String, Node> givenKeys(
      String path, MappingNode node, ValueType.Section section, Set<String> meant) {
    final Map<String, Node> given = new LinkedHashMap<>();
    final Map<String, Integer> lines = new HashMap<>();
    final List<String> known = section.keys().stream().map(Key::name).collect(Collectors.toList());
    for (final NodeTuple tuple : node.getValue()) {
      final Node keyNode = tuple.getKeyNode();
      if (!(keyNode instanceof ScalarNode scalar)) {
        faults.add(place(keyNode), path, "a key must be a word");
        continue;
      }
      final String key = scalar.getValue();
      final String name = path.isEmpty() ? key : path + "." + key;
      final Integer first = lines.putIfAbsent(key, place(keyNode).line());
      if (first != null) {
        faults.add(place(keyNode), name, "duplicate key; it stands first in line " + first);
      } else if (known.contains(key)) {
        given.put(key, tuple.getValueNode());
        values.place(name, place(placeNode(tuple)));
      } else {
        faults.add(place(keyNode), name, unknown(key, path, known));
        NearestName.of(key, known).ifPresent(meant::add);
      }
    }
    return given;
  }

  private static String unknown(String key, String path, List<String> known) {
    final String advice =
        NearestName.of(key, known)
            .map(near -> "nearest known key: " + near)
            .or(() -> StudySchema.blockOf(key, path).map(block -> "it belongs under " + block))
            .orElse("known here: " + String.join(", ", known));
    return "unknown key; " + advice;
  }

  private void absent(String name, Key key) {
    if (key.required()) {
      if (key.use().compareTo(goal) <= 0) {
        final int dot = name.lastIndexOf('.');
        final Values.Place block = values.placeOf(dot < 0 ? "" : name.substring(0, dot));
        faults.add(block, name, "missing; " + key.type().needed());
      }
    } else if (key.filledWhenAbsent()) {
      for (final Key inner : ((ValueType.Section) key.type()).keys()) {
        absent(name + "." + inner.name(), inner);
      }
    } else if (key.standard() != null && key.standard().startsWith("= ")) {
      copies.put(name, key.standard().substring(2));
    } else if (key.standard() != null) {
      values.put(name, ScalarReader.standard(key.standard(), key.type()));
    }
  }

  private void noticeLater(String name, Key key, String path) {
    final boolean blockNamed = notices.stream().anyMatch(n -> n.startsWith(path + " "));
    if (key.use() == Use.LATER && !blockNamed) {
      notices.add(name + " is not used by this version yet");
    }
  }

  private void value(String name, Node node, ValueType type) {
    if (node instanceof ScalarNode scalar) {
      scalar(name, scalar, type);
    } else if (node instanceof SequenceNode list) {
      list(name, list, type);
    } else if (node instanceof MappingNode block) {
      block(name, block, type);
    }
  }

  private void scalar(String name, ScalarNode node, ValueType type) {
    final String text = node.getValue().strip();
    final boolean nothing =
        node.isPlain() && (text.isEmpty() || text.equals("~") || text.equals("null"));
    if (nothing) {
      faults.add(place(node), name, "found nothing; " + type.needed());
      return;
    }
    if (!ScalarReader.fitsText(type)) {
      faults.add(place(node), name, "found " + ScalarReader.quote(text) + "; " + type.needed());
      return;
    }
    try {
      final Object value = ScalarReader.read(text, type);
      values.put(name, value);
      if (type instanceof ValueType.Deviation deviation) {
        deviations.put(name, deviation);
      }
    } catch (ScalarReader.Refusal e) {
      faults.add(place(node), name, e.getMessage());
    }
  }

  private void list(String name, SequenceNode node, ValueType type) {
    if (!(type instanceof ValueType.Many many)) {
      faults.add(place(node), name, "found a list; " + type.needed());
      return;
    }
    final int size = node.getValue().size();
    if (size < many.least() || size > many.most()) {
      faults.add(place(node), name, "found a list of " + size + "; " + type.needed());
      return;
    }
    final List<Object> read = new ArrayList<>();
    for (int i = 0; i < size; i++) {
      final String element = name + "[" + i + "]";
      value(element, node.getValue().get(i), many.element());
      values.find(element).ifPresent(read::add);
      values.remove(element);
    }
    if (read.size() == size) {
      values.put(name, List.copyOf(read));
    }
  }

  private void block(String name, MappingNode node, ValueType type) {
    if (type instanceof ValueType.Section section) {
      section(name, node, section);
    } else if (type instanceof ValueType.WordOr either
        && either.other() instanceof ValueType.Section section) {
      section(name, node, section);
    } else if (type instanceof ValueType.FileOr either) {
      section(name, node, either.block());
    } else {
      faults.add(place(node), name, "found a block of keys; " + type.needed());
    }
  }

  private void resolveCopies() {
    for (final Map.Entry<String, String> copy : copies.entrySet()) {
      values
          .find(copy.getValue())
          .ifPresent(
              value ->
                  values.put(
                      copy.getKey(), StudySchema.isList(copy.getKey()) ? List.of(value) : value));
    }
  }

  private void resolveDeviations() {
    for (final Map.Entry<String, ValueType.Deviation> entry : deviations.entrySet()) {
      final String name = entry.getKey();
      if (values.find(name).orElse(null) instanceof ScalarReader.Absolute absolute) {
        values.remove(name);
        values
            .findNumber(entry.getValue().nominal())
            .ifPresent(nominal -> share(name, entry.getValue(), absolute, nominal));
      }
    }
  }

  private void share(
      String name, ValueType.Deviation type, ScalarReader.Absolute absolute, double nominal) {
    final double share = absolute.value() / Math.abs(nominal);
    if (share <= 1) {
      values.put(name, share);
    } else {
      faults.add(
          values.placeOf(name),
          name,
          "found "
              + absolute.text()
              + ", more than "
              + type.nominal()
              + " itself; "
              + type.needed());
    }
  }

  /** A value stands where it begins; a block of keys on lines of its own stands at its name. */
  private static Node placeNode(NodeTuple tuple) {
    return tuple.getValueNode() instanceof MappingNode block
            && block.getFlowStyle() == FlowStyle.BLOCK
        ? tuple.getKeyNode()
        : tuple.getValueNode();
  }

  private static Values.Place place(Node node) {
    final Mark mark = node.getStartMark().orElseThrow();
    return new Values.Place(mark.getLine() + 1, mark.getColumn() + 1);
  }
}
