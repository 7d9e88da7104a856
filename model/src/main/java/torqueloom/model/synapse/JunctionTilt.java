package torqueloom.model.synapse;

import torqueloom.model.constants.PhysicalConstants;

/**
 * Conductance of a tunnel junction whose free layer has a net perpendicular anisotropy field B_k and
 * an in-plane bias field B_f along the reference layer (x).
 *
 * <p>Energy per moment: -(B_k/2) mz² - B_f mx. The moment tilts to mx = B_f/B_k (1 when B_k &lt;=
 * B_f), and with the cosine law of the conductance (J. C. Slonczewski, Phys. Rev. B 39, 6995 (1989),
 * from memory)
 *
 * <pre>  G = (G_P + G_AP)/2 + (G_P - G_AP)/2 &lt;mx&gt;</pre>
 *
 * where &lt;mx&gt; is the Boltzmann average over the sphere. Both wells, +mz and -mz, give the same mx.
 */
final class JunctionTilt {
  private static final double[] NODES = {
    0.0950125098376374, 0.2816035507792589, 0.4580167776572274, 0.6178762444026438,
    0.7554044083550030, 0.8656312023878318, 0.9445750230732326, 0.9894009349916499
  };
  private static final double[] WEIGHTS = {
    0.1894506104550685, 0.1826034150449236, 0.1691565193950025, 0.1495959888165767,
    0.1246289712555339, 0.0951585116824928, 0.0622535239386479, 0.0271524594117541
  };

  private JunctionTilt() {}

  /** Projection without thermal motion: B_f/B_k, at most 1. */
  static double restProjection(double anisotropyField, double biasField) {
    return anisotropyField <= biasField ? 1 : biasField / anisotropyField;
  }

  /**
   * Boltzmann average of mx: over c = mx by 16-point Gauss-Legendre panels (nodes and weights from
   * memory, checked to sum to 2), each value integrated over the azimuth about x by the periodic
   * trapezoidal rule, which converges faster than any power.
   *
   * @param anisotropyField B_k (T), &gt;= 0
   * @param biasField B_f (T), &gt;= 0
   * @param moment Ms V (A m²)
   * @param temperature (K), &gt; 0
   */
  static double meanProjection(
      double anisotropyField, double biasField, double moment, double temperature) {
    final double perTesla = moment / (PhysicalConstants.BOLTZMANN * temperature);
    final double k = perTesla * anisotropyField;
    final double f = perTesla * biasField;
    final double rest = restProjection(anisotropyField, biasField);
    final double top = k * (1 - rest * rest) / 2 + f * rest;
    final int panels = 4 + (int) Math.ceil(2 * Math.sqrt(k + f));
    double norm = 0;
    double sum = 0;
    for (int panel = 0; panel < panels; panel++) {
      final double middle = -1 + (2 * panel + 1.0) / panels;
      for (int j = 0; j < 2 * NODES.length; j++) {
        final double c = middle + (j % 2 == 0 ? NODES[j / 2] : -NODES[j / 2]) / panels;
        final double weight = WEIGHTS[j / 2] * azimuthalWeight(k * (1 - c * c) / 2, f * c - top);
        norm += weight;
        sum += weight * c;
      }
    }
    return sum / norm;
  }

  /** Mean over the azimuth of exp(peak cos² azimuth + offset). */
  private static double azimuthalWeight(double peak, double offset) {
    final int points = 16 + 4 * (int) Math.ceil(Math.sqrt(peak));
    double sum = 0;
    for (int i = 0; i < points; i++) {
      final double cosine = StrictMath.cos(Math.PI * i / points);
      sum += StrictMath.exp(peak * cosine * cosine + offset);
    }
    return sum / points;
  }

  /**
   * Conductance at a detuned anisotropy field (S).
   *
   * @param junction parameters
   * @param anisotropyField B_k at this detuning (T)
   * @param temperature (K)
   */
  static double conductance(
      JunctionParameters junction, double anisotropyField, double temperature) {
    final double projection =
        meanProjection(anisotropyField, junction.biasField(), junction.moment(), temperature);
    final double parallel = junction.area() / junction.resistanceArea();
    final double antiparallel = parallel / (1 + junction.magnetoresistance());
    return (parallel + antiparallel) / 2 + (parallel - antiparallel) / 2 * projection;
  }
}
