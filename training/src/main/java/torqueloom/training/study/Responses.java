package torqueloom.training.study;

import java.util.ArrayList;
import java.util.List;
import torqueloom.model.response.CountTable;
import torqueloom.model.response.CountTables;
import torqueloom.model.response.ResponseLibrary;
import torqueloom.model.response.ResponseMatcher;
import torqueloom.training.evaluation.NeuronBank;

/**
 * A response library as the network uses it.
 *
 * @param library calibrated responses
 * @param matcher finds the instance that answers for a drawn neuron
 * @param banks one a temperature of the library
 * @param reference index of the temperature nearest to the device's reference
 */
record Responses(
    ResponseLibrary library, ResponseMatcher matcher, List<NeuronBank> banks, int reference) {

  static Responses of(ResponseLibrary library, double unitDrive, double referenceTemperature) {
    final CountTables tables = CountTables.of(library);
    final List<NeuronBank> banks = new ArrayList<>();
    int reference = 0;
    for (int t = 0; t < library.temperatures().size(); t++) {
      final List<CountTable> instances = new ArrayList<>();
      for (int i = 0; i < tables.instances(); i++) {
        instances.add(tables.table(t, i));
      }
      banks.add(NeuronBank.of(instances, unitDrive));
      if (distance(library, t, referenceTemperature)
          < distance(library, reference, referenceTemperature)) {
        reference = t;
      }
    }
    return new Responses(library, ResponseMatcher.of(library), List.copyOf(banks), reference);
  }

  /** Responses at the temperature nearest to the device's reference. */
  NeuronBank referenceBank() {
    return banks.get(reference);
  }

  private static double distance(ResponseLibrary library, int t, double temperature) {
    return Math.abs(library.temperatures().get(t) - temperature);
  }
}
