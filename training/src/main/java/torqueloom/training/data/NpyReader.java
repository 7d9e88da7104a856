package torqueloom.training.data;

import java.nio.ByteBuffer;
import java.nio.ByteOrder;
import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * Reads NPY files, versions 1 to 3, of booleans, integers and floats in either byte order and
 * either memory order (format: NumPy Enhancement Proposal 1, from memory). Arrays of objects are
 * refused: they hold pickled code.
 */
final class NpyReader {
  private static final Pattern DESCR = Pattern.compile("'descr'\\s*:\\s*'([^']*)'");
  private static final Pattern ORDER = Pattern.compile("'fortran_order'\\s*:\\s*(True|False)");
  private static final Pattern SHAPE = Pattern.compile("'shape'\\s*:\\s*\\(([0-9, ]*)\\)");
  private static final Pattern TYPE = Pattern.compile("[<>|=]?(b1|[iu][1248]|f[48])");

  private NpyReader() {}

  static boolean accepts(DataFile file) {
    return file.startsWith(0x93, 'N', 'U', 'M', 'P', 'Y');
  }

  /**
   * @throws TaskDataException if header, type or length do not fit
   */
  static NumberArray read(DataFile file) {
    final ByteBuffer in = ByteBuffer.wrap(file.bytes()).order(ByteOrder.LITTLE_ENDIAN);
    final String header = header(file, in);
    final String descr = find(file, DESCR, header, "descr");
    if (!TYPE.matcher(descr).matches()) {
      throw new TaskDataException(
          TaskDataException.fault(
              file.name(), "type", '"' + descr + '"', "booleans, integers and floats are allowed"));
    }
    final int[] shape = shape(file, find(file, SHAPE, header, "shape"));
    final int elements = NumberArray.elements(file.name(), shape);
    in.order(descr.startsWith(">") ? ByteOrder.BIG_ENDIAN : ByteOrder.LITTLE_ENDIAN);
    final String type = descr.substring(descr.length() - 2);
    final long needed = (long) elements * (type.charAt(1) - '0');
    if (in.remaining() != needed) {
      throw new TaskDataException(
          file.name()
              + ": has "
              + in.remaining()
              + " data bytes where its header announces "
              + needed);
    }
    final double[] values = new double[elements];
    for (int i = 0; i < elements; i++) {
      values[i] = next(in, type);
    }
    final boolean columnMajor = find(file, ORDER, header, "fortran_order").equals("True");
    return new NumberArray(shape, columnMajor ? rowMajor(values, shape) : values);
  }

  private static String header(DataFile file, ByteBuffer in) {
    if (in.remaining() < 12) {
      throw new TaskDataException(file.name() + ": ends within its header");
    }
    final int version = in.get(6);
    final boolean wide = version > 1;
    final long length = wide ? in.getInt(8) & 0xFFFFFFFFL : in.getShort(8) & 0xFFFF;
    in.position(wide ? 12 : 10);
    if (version < 1 || version > 3 || length > in.remaining()) {
      throw new TaskDataException(
          file.name()
              + ": NPY version "
              + version
              + " with a header of "
              + length
              + " bytes; versions 1 to 3 with a whole header are allowed");
    }
    final byte[] text = new byte[(int) length];
    in.get(text);
    return new String(text, StandardCharsets.UTF_8);
  }

  private static String find(DataFile file, Pattern pattern, String header, String key) {
    final Matcher matcher = pattern.matcher(header);
    if (!matcher.find()) {
      throw new TaskDataException(file.name() + ": the header has no usable '" + key + "'");
    }
    return matcher.group(1);
  }

  private static int[] shape(DataFile file, String text) {
    try {
      final int[] shape =
          Arrays.stream(text.split(","))
              .map(String::strip)
              .filter(part -> !part.isEmpty())
              .mapToInt(Integer::parseInt)
              .toArray();
      if (shape.length > 0) {
        return shape;
      }
    } catch (NumberFormatException e) {
      // An axis of more than 2^31-1 elements; told below together with the empty shape.
    }
    throw new TaskDataException(
        file.name() + ": shape (" + text + "); an array with one axis for the cases is needed");
  }

  private static double next(ByteBuffer in, String type) {
    return switch (type) {
      case "b1", "u1" -> in.get() & 0xFF;
      case "i1" -> in.get();
      case "u2" -> in.getShort() & 0xFFFF;
      case "i2" -> in.getShort();
      case "u4" -> in.getInt() & 0xFFFFFFFFL;
      case "i4" -> in.getInt();
      case "u8", "i8" -> in.getLong();
      case "f4" -> in.getFloat();
      case "f8" -> in.getDouble();
      default -> throw new IllegalStateException("type " + type + " was let through");
    };
  }

  /** Reorders values whose first axis runs fastest. */
  private static double[] rowMajor(double[] values, int[] shape) {
    final double[] result = new double[values.length];
    final int[] place = new int[shape.length];
    for (int i = 0; i < values.length; i++) {
      int source = 0;
      for (int axis = shape.length - 1; axis >= 0; axis--) {
        source = source * shape[axis] + place[axis];
      }
      result[i] = values[source];
      for (int axis = shape.length - 1; axis >= 0 && ++place[axis] == shape[axis]; axis--) {
        place[axis] = 0;
      }
    }
    return result;
  }
}
