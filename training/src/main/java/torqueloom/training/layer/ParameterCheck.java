package torqueloom.training.layer;

import java.io.ByteArrayInputStream;
import java.io.DataInputStream;
import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.file.Path;

/**
 * Reads the values of the parameter array. Its header is foreign: the library would reserve
 * whatever size and follow whatever strides it claims, so nothing of it is handed on. Layout: a
 * buffer with the shape (allocation word, length, type word, whole numbers), then a buffer with the
 * values, big-endian.
 */
final class ParameterCheck {
  private static final int LONGEST_SHAPE = 68;

  /** Bytes of both headers at most. */
  static final int LONGEST_HEADER = 1024;

  private ParameterCheck() {}

  /**
   * @param bytes the entry
   * @param parameters number of parameters that the configuration asks for
   * @param path file named in messages
   * @return values, [parameters]
   * @throws NetworkFileException if the entry does not hold just these values, all finite
   */
  static float[] values(byte[] bytes, int parameters, Path path) throws NetworkFileException {
    try (DataInputStream in = new DataInputStream(new ByteArrayInputStream(bytes))) {
      in.readUTF();
      final long shapeLength = in.readLong();
      final String shapeType = in.readUTF();
      if (shapeLength < 0 || shapeLength > LONGEST_SHAPE || !"LONG".equals(shapeType)) {
        throw new NetworkFileException(
            path, "the parameters' shape has " + shapeLength + " numbers of type " + shapeType);
      }
      in.skipNBytes(8 * shapeLength);
      in.readUTF();
      final long length = in.readLong();
      final String type = in.readUTF();
      if (length != parameters || !"FLOAT".equals(type)) {
        throw new NetworkFileException(
            path,
            "the parameters' header claims "
                + length
                + " values of type "
                + type
                + ", the configuration needs "
                + parameters
                + " of type FLOAT");
      }
      if (in.available() != 4L * parameters) {
        throw new NetworkFileException(
            path,
            "the parameters hold " + in.available() + " bytes, " + 4L * parameters + " needed");
      }
      return finite(in.readAllBytes(), parameters, path);
    } catch (NetworkFileException e) {
      throw e;
    } catch (IOException e) {
      throw new NetworkFileException(path, "the parameters end in the header");
    }
  }

  private static float[] finite(byte[] bytes, int parameters, Path path)
      throws NetworkFileException {
    final float[] values = new float[parameters];
    ByteBuffer.wrap(bytes).asFloatBuffer().get(values);
    for (int i = 0; i < parameters; i++) {
      if (!Float.isFinite(values[i])) {
        throw new NetworkFileException(path, "parameter " + i + " is " + values[i]);
      }
    }
    return values;
  }
}
