package torqueloom.model.work;

/** Texts stand for themselves; {@code ?} is refused, as by a codec of another version. */
enum TextCodec implements Codec<String> {
  INSTANCE;

  @Override
  public String encode(String result) {
    return result;
  }

  @Override
  public String decode(String payload) {
    if (payload.equals("?")) {
      throw new IllegalArgumentException("not mine");
    }
    return payload;
  }
}
