package torqueloom.training.data;

import java.io.ByteArrayInputStream;
import java.io.DataInputStream;
import java.io.EOFException;
import java.io.IOException;
import java.io.InputStream;
import java.nio.ByteBuffer;
import java.util.Arrays;
import java.util.zip.GZIPInputStream;

/**
 * Reads IDX files, plain or gzipped: two zero bytes, a type code, the number of axes, each axis as
 * a big-endian 32-bit length, then the numbers, big-endian (the format published with the MNIST
 * data by Y. LeCun, C. Cortes and C. J. C. Burges; from memory).
 */
final class IdxReader {
  private IdxReader() {}

  static boolean accepts(DataFile file) {
    return isGzip(file) || file.startsWith(0, 0);
  }

  private static boolean isGzip(DataFile file) {
    return file.startsWith(0x1F, 0x8B);
  }

  /**
   * @throws TaskDataException if the magic number, the type or the length is wrong
   */
  static NumberArray read(DataFile file) {
    final InputStream raw = new ByteArrayInputStream(file.bytes());
    try (DataInputStream in = new DataInputStream(isGzip(file) ? new GZIPInputStream(raw) : raw)) {
      return read(file.name(), in);
    } catch (EOFException e) {
      throw new TaskDataException(file.name() + ": ends too early; the file is cut short");
    } catch (IOException e) {
      throw new TaskDataException(file.name() + ": damaged gzip file (" + e.getMessage() + ")");
    }
  }

  private static NumberArray read(String file, DataInputStream in) throws IOException {
    final int magic = in.readInt();
    final Type type = Type.of((magic >>> 8) & 0xFF);
    final int axes = magic & 0xFF;
    if ((magic >>> 16) != 0 || type == null || axes < 1 || axes > 8) {
      throw new TaskDataException(
          TaskDataException.fault(
              file,
              "magic number",
              String.format("0x%08X", magic),
              "an IDX file starts 00 00, a type code (08, 09, 0B, 0C, 0D, 0E), 1 to 8 axes"));
    }
    final int[] shape = new int[axes];
    for (int i = 0; i < axes; i++) {
      shape[i] = in.readInt();
    }
    final int elements = NumberArray.elements(file, shape);
    final double[] values = values(file, in, type, elements);
    if (in.read() >= 0) {
      throw new TaskDataException(
          file + ": goes on after the " + elements + " numbers its header announces");
    }
    return new NumberArray(shape, values);
  }

  private static double[] values(String file, DataInputStream in, Type type, int elements)
      throws IOException {
    // Grown with what is really there: a header alone must not claim gigabytes.
    double[] values = new double[Math.min(elements, 1 << 20)];
    final byte[] block = new byte[8192];
    int read = 0;
    while (read < elements) {
      final int wanted = Math.min(block.length / type.size, elements - read);
      final int got = in.readNBytes(block, 0, wanted * type.size) / type.size;
      if (read + got > values.length) {
        values = Arrays.copyOf(values, Math.min(elements, 2 * values.length));
      }
      final ByteBuffer buffer = ByteBuffer.wrap(block);
      for (int i = 0; i < got; i++) {
        values[read++] = type.next(buffer);
      }
      if (got < wanted) {
        throw new TaskDataException(
            file
                + ": ends after "
                + read
                + " of the "
                + elements
                + " numbers its header announces");
      }
    }
    return values;
  }

  private enum Type {
    UNSIGNED_BYTE(0x08, 1),
    BYTE(0x09, 1),
    SHORT(0x0B, 2),
    INT(0x0C, 4),
    FLOAT(0x0D, 4),
    DOUBLE(0x0E, 8);

    private final int code;
    private final int size;

    Type(int code, int size) {
      this.code = code;
      this.size = size;
    }

    static Type of(int code) {
      return Arrays.stream(values()).filter(type -> type.code == code).findFirst().orElse(null);
    }

    double next(ByteBuffer buffer) {
      return switch (this) {
        case UNSIGNED_BYTE -> buffer.get() & 0xFF;
        case BYTE -> buffer.get();
        case SHORT -> buffer.getShort();
        case INT -> buffer.getInt();
        case FLOAT -> buffer.getFloat();
        case DOUBLE -> buffer.getDouble();
      };
    }
  }
}
