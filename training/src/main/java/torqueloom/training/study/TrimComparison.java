package torqueloom.training.study;

/**
 * The same chips with and without trim at the reference temperature.
 *
 * @param assumed whether the trim is not part of the study but assumed here, to show what it buys
 * @param range range of the trim, plus and minus (J/m²)
 * @param levels number of levels
 * @param chips number of chips compared
 * @param medianWith median accuracy with trim (1)
 * @param medianWithout median accuracy without (1)
 * @param difference mean paired difference with minus without, with its interval (1)
 * @param yieldWith share of chips at the target with trim
 * @param yieldWithout share of chips at the target without
 * @param outOfFilmWith share of neurons whose easy axis is out of the film, with trim (1)
 * @param outOfFilmWithout the same without (1)
 */
public record TrimComparison(
    boolean assumed,
    double range,
    int levels,
    int chips,
    double medianWith,
    double medianWithout,
    Interval difference,
    Interval yieldWith,
    Interval yieldWithout,
    double outOfFilmWith,
    double outOfFilmWithout) {}
