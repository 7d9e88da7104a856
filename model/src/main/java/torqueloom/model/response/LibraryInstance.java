package torqueloom.model.response;

/**
 * One device of the response library at one temperature, after trim.
 *
 * @param instance 0 for the nominal device
 * @param temperatureKelvin (K)
 * @param torquePerDrive spin-torque field per drive (T per drive unit)
 * @param features as {@link torqueloom.model.device.DeviceKind#features}, [features]
 */
public record LibraryInstance(
    int instance, double temperatureKelvin, double torquePerDrive, double[] features) {}
