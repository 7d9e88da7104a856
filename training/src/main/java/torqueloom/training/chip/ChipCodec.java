package torqueloom.training.chip;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import torqueloom.model.table.CanonicalJson;
import torqueloom.model.table.FileContentException;
import torqueloom.model.table.JsonFields;
import torqueloom.model.table.JsonReader;
import torqueloom.model.work.Codec;

/** A chip's outcomes as one line of JSON for the store. */
public final class ChipCodec implements Codec<List<ChipOutcome>> {
  @Override
  public String encode(List<ChipOutcome> outcomes) {
    final List<Object> list = new ArrayList<>();
    for (final ChipOutcome outcome : outcomes) {
      final Map<String, Object> fields = new LinkedHashMap<>();
      fields.put("rows", outcome.rows());
      fields.put("perPass", outcome.perPass());
      fields.put("clipped", outcome.clippedShare());
      list.add(fields);
    }
    return CanonicalJson.line(Map.of("outcomes", list));
  }

  @Override
  public List<ChipOutcome> decode(String payload) {
    try {
      final JsonFields fields = JsonFields.of(JsonReader.parse(payload, "store"), "store");
      final List<ChipOutcome> outcomes = new ArrayList<>();
      for (final JsonFields one : fields.objects("outcomes")) {
        outcomes.add(
            new ChipOutcome(
                ChipOutcome.rows(one.text("rows")),
                one.integers("perPass"),
                one.number("clipped")));
      }
      return outcomes;
    } catch (FileContentException e) {
      throw new IllegalArgumentException(e.getMessage(), e);
    }
  }
}
