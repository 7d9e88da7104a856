/**
 * Pictures as SVG: charts of marks on two axes. A chart is an immutable value; the same chart gives
 * the same characters on every machine. Marks differ in color, in dash and in shape together, so that
 * no reading depends on color alone; colors order by lightness and survive a gray print. Points that
 * are not finite are left out, never drawn somewhere else.
 *
 * <table>
 *   <caption>Marks</caption>
 *   <tr><td>{@link torqueloom.reports.figure.LineMark}</td><td>curve, points, error bars</td></tr>
 *   <tr><td>{@link torqueloom.reports.figure.BandMark}</td><td>area between two curves</td></tr>
 *   <tr><td>{@link torqueloom.reports.figure.StepMark}</td><td>histogram or staircase</td></tr>
 *   <tr><td>{@link torqueloom.reports.figure.SwarmMark}</td><td>every value of a sample, in columns</td></tr>
 *   <tr><td>{@link torqueloom.reports.figure.BoxMark}</td><td>quartiles and whiskers</td></tr>
 *   <tr><td>{@link torqueloom.reports.figure.BarMark}</td><td>amounts by name</td></tr>
 *   <tr><td>{@link torqueloom.reports.figure.HeatMark}</td><td>a table of numbers as colored cells</td></tr>
 *   <tr><td>{@link torqueloom.reports.figure.RuleMark}</td><td>a target or a reference</td></tr>
 * </table>
 */
package torqueloom.reports.figure;
