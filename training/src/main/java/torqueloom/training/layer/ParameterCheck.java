package torqueloom.training.layer;

import java.io.ByteArrayInputStream;
import java.io.DataInputStream;
import java.io.IOException;
import java.nio.file.Path;

/**
 * Checks the header of the parameter array before the library reads it: the library would reserve
 * whatever size the header claims. Layout: a buffer with the shape (allocation word, length, type
 * word, whole numbers), then a buffer with the values.
 */
final class ParameterCheck {
  private static final int LONGEST_SHAPE = 68;

  private ParameterCheck() {}

  /**
   * @param bytes the entry
   * @param parameters number of parameters that the configuration asks for
   * @param path file named in messages
   * @throws NetworkFileException if the header does not fit the configuration
   */
  static void check(byte[] bytes, long parameters, Path path) throws NetworkFileException {
    try (DataInputStream in = new DataInputStream(new ByteArrayInputStream(bytes))) {
      in.readUTF();
      final long shapeLength = in.readLong();
      final String shapeType = in.readUTF();
      if (shapeLength < 0 || shapeLength > LONGEST_SHAPE || !"LONG".equals(shapeType)) {
        throw new NetworkFileException(
            path, "the parameters' shape has " + shapeLength + " numbers of type " + shapeType);
      }
      checkShape(in, shapeLength, parameters, path);
      in.readUTF();
      final long length = in.readLong();
      final String type = in.readUTF();
      if (length != parameters || !"FLOAT".equals(type)) {
        throw new NetworkFileException(
            path,
            "the parameters' header claims " + length + " values of type " + type
                + ", the configuration needs " + parameters + " of type FLOAT");
      }
      if (in.available() != 4 * parameters) {
        throw new NetworkFileException(
            path, "the parameters hold " + in.available() + " bytes, " + 4 * parameters + " needed");
      }
    } catch (NetworkFileException e) {
      throw e;
    } catch (IOException e) {
      throw new NetworkFileException(path, "the parameters end in the header");
    }
  }

  /** The shape: rank, then the sizes; their product must be the number of parameters. */
  private static void checkShape(DataInputStream in, long numbers, long parameters, Path path)
      throws IOException {
    final long[] shape = new long[(int) numbers];
    for (int i = 0; i < shape.length; i++) {
      shape[i] = in.readLong();
    }
    long product = shape.length == 0 || shape[0] < 0 || shape[0] >= shape.length ? -1 : 1;
    for (int i = 1; product >= 0 && i <= shape[0]; i++) {
      product = shape[i] < 0 || shape[i] > parameters ? -1 : product * shape[i];
    }
    if (product != parameters) {
      throw new NetworkFileException(
          path, "the parameters' shape does not hold " + parameters + " values");
    }
  }
}
