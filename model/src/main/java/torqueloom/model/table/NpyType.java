package torqueloom.model.table;

import java.nio.ByteBuffer;

/** A number type of an NPY file that can be read as a double. */
enum NpyType {
  /** IEEE 754 binary64. */
  FLOAT64("<f8", 8),
  /** IEEE 754 binary32. */
  FLOAT32("<f4", 4),
  /** Signed, 64 bits; beyond 2^53 rounded. */
  INT64("<i8", 8),
  /** Signed, 32 bits. */
  INT32("<i4", 4),
  /** Signed, 16 bits. */
  INT16("<i2", 2),
  /** Signed, 8 bits. */
  INT8("|i1", 1),
  /** Unsigned, 32 bits. */
  UINT32("<u4", 4),
  /** Unsigned, 16 bits. */
  UINT16("<u2", 2),
  /** Unsigned, 8 bits. */
  UINT8("|u1", 1),
  /** Truth values, 0 or 1. */
  BOOLEAN("|b1", 1);

  private final String description;
  private final int width;

  NpyType(String description, int width) {
    this.description = description;
    this.width = width;
  }

  /** Bytes of one number. */
  int width() {
    return width;
  }

  /**
   * @throws FileContentException naming the type that is not read
   */
  static NpyType of(String description, String file) throws FileContentException {
    for (final NpyType type : values()) {
      if (type.description.equals(description)) {
        return type;
      }
    }
    throw new FileContentException(
        file,
        0,
        named(description),
        "little-endian numbers are needed, e.g. float64 (<f8) or int32 (<i4)");
  }

  private static String named(String description) {
    if (description.contains("O")) {
      return "Python objects (dtype object)";
    }
    if (description.startsWith(">")) {
      return "big-endian numbers (" + description + ")";
    }
    return "numbers of type " + description;
  }

  /** The next number of the buffer, which must be little-endian. */
  double next(ByteBuffer buffer) {
    return switch (this) {
      case FLOAT64 -> buffer.getDouble();
      case FLOAT32 -> buffer.getFloat();
      case INT64 -> buffer.getLong();
      case INT32 -> buffer.getInt();
      case INT16 -> buffer.getShort();
      case INT8 -> buffer.get();
      case UINT32 -> Integer.toUnsignedLong(buffer.getInt());
      case UINT16 -> Short.toUnsignedInt(buffer.getShort());
      case UINT8, BOOLEAN -> Byte.toUnsignedInt(buffer.get());
    };
  }
}
