package torqueloom.model.work;

/**
 * Result to text and back, for the store.
 *
 * @param <R> the result
 */
public interface Codec<R> {
  /**
   * The text of a result; decoding it must give an equal result, to the last bit of each number.
   */
  String encode(R result);

  /**
   * The result of a text.
   *
   * @throws IllegalArgumentException if the text was not written by this codec; the unit is then
   *     computed anew
   */
  R decode(String payload);
}
