package torqueloom.training.study;

/**
 * What the stated tolerances cost: the study's chips against the same chips with zero tolerances
 * (paired draws), at the reference temperature.
 *
 * @param chips number of chips compared
 * @param medianAtZero median accuracy with zero tolerances (1)
 * @param medianAtStated median accuracy with the stated ones (1)
 * @param loss median of the paired loss with its interval (1)
 */
public record ToleranceEffect(
    int chips, double medianAtZero, double medianAtStated, Interval loss) {}
