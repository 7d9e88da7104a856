package torqueloom.model.response;

import java.util.LinkedHashMap;
import java.util.Map;
import torqueloom.model.table.CanonicalJson;
import torqueloom.model.table.FileContentException;
import torqueloom.model.table.JsonFields;
import torqueloom.model.table.JsonReader;
import torqueloom.model.work.Codec;

/** Calibrated units and carry-over measurements as lines of the run's store. */
final class UnitCodec implements Codec<CalibratedUnit> {
  private static final String SOURCE = "stored unit";

  private final String driveUnit;

  UnitCodec(String driveUnit) {
    this.driveUnit = driveUnit;
  }

  @Override
  public String encode(CalibratedUnit unit) {
    final Map<String, Object> line = new LinkedHashMap<>();
    line.put("replicaSteps", unit.replicaSteps());
    line.put("instance", LibraryFile.entry(unit.instance()));
    line.put("response", ResponseJson.entry(unit.curve(), driveUnit));
    return CanonicalJson.line(line);
  }

  @Override
  public CalibratedUnit decode(String payload) {
    try {
      final JsonFields line = JsonFields.of(JsonReader.parse(payload, SOURCE), SOURCE);
      return new CalibratedUnit(
          LibraryFile.instance(line.object("instance"), -1),
          ResponseJson.curve(line.object("response")),
          line.whole("replicaSteps"));
    } catch (final FileContentException e) {
      throw new IllegalArgumentException(e.getMessage(), e);
    }
  }

  /** The same for a measured carry-over. */
  static final class CarryOverCodec implements Codec<CarryOver> {
    @Override
    public String encode(CarryOver measured) {
      return CanonicalJson.line(measured);
    }

    @Override
    public CarryOver decode(String payload) {
      try {
        final JsonFields line = JsonFields.of(JsonReader.parse(payload, SOURCE), SOURCE);
        return new CarryOver(
            line.number("totalVariation"),
            line.number("floor"),
            line.number("drive"),
            line.number("previousDrive"),
            line.integer("trials"),
            line.whole("replicaSteps"));
      } catch (final FileContentException e) {
        throw new IllegalArgumentException(e.getMessage(), e);
      }
    }
  }
}
