package torqueloom.model.units;

/** Why a piece of text is no number or no unit; always turned into a {@link QuantityException}. */
final class UnitRefusal extends RuntimeException {
  private static final long serialVersionUID = 1L;

  UnitRefusal(String reason) {
    super(reason, null, false, false);
  }
}
