package torqueloom.model.table;

import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.ByteOrder;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import torqueloom.model.work.AtomicFiles;

/**
 * Arrays in NumPy's NPY format (NumPy Enhancement Proposal 1, from memory).
 *
 * <p>Written: float64 and int32, little-endian, C order, version 1.0. Read: little-endian integers
 * and floats of any width, versions 1 to 3. Objects (which NumPy pickles, and a pickle can run
 * code), Fortran order and big-endian numbers are refused by name.
 */
public final class NpyFiles {
  private static final byte[] MAGIC = {(byte) 0x93, 'N', 'U', 'M', 'P', 'Y'};
  private static final int ALIGNMENT = 64;
  private static final Pattern DESCRIPTION = Pattern.compile("'descr'\\s*:\\s*'([^']*)'");
  private static final Pattern FORTRAN = Pattern.compile("'fortran_order'\\s*:\\s*(True|False)");
  private static final Pattern SHAPE = Pattern.compile("'shape'\\s*:\\s*\\(([0-9,\\s]*)\\)");

  private NpyFiles() {}

  /**
   * Writes float64 numbers, whole file or nothing.
   *
   * @param values in C order
   * @param shape length of each axis
   * @throws IllegalArgumentException if shape and number of values do not fit
   * @throws IOException if the file cannot be written
   */
  public static void write(Path path, double[] values, int... shape) throws IOException {
    final ByteBuffer buffer = started("<f8", shape, values.length, Double.BYTES);
    for (final double value : values) {
      buffer.putDouble(value);
    }
    AtomicFiles.write(path, buffer.array());
  }

  /**
   * Writes int32 numbers, whole file or nothing.
   *
   * @param values in C order
   * @param shape length of each axis
   * @throws IllegalArgumentException if shape and number of values do not fit
   * @throws IOException if the file cannot be written
   */
  public static void write(Path path, int[] values, int... shape) throws IOException {
    final ByteBuffer buffer = started("<i4", shape, values.length, Integer.BYTES);
    for (final int value : values) {
      buffer.putInt(value);
    }
    AtomicFiles.write(path, buffer.array());
  }

  private static ByteBuffer started(String type, int[] shape, int count, int width) {
    if (product(shape) != count) {
      throw new IllegalArgumentException(
          "shape " + Arrays.toString(shape) + " does not hold " + count + " values");
    }
    final String axes =
        Arrays.stream(shape).mapToObj(String::valueOf).collect(Collectors.joining(", "));
    final String comma = shape.length == 1 ? "," : "";
    final String text =
        "{'descr': '" + type + "', 'fortran_order': False, 'shape': (" + axes + comma + "), }";
    final int prefix = MAGIC.length + 4;
    final int header = (prefix + text.length() + 1 + ALIGNMENT - 1) / ALIGNMENT * ALIGNMENT;
    final ByteBuffer buffer =
        ByteBuffer.allocate(Math.addExact(header, Math.multiplyExact(count, width)))
            .order(ByteOrder.LITTLE_ENDIAN);
    buffer.put(MAGIC).put((byte) 1).put((byte) 0).putShort((short) (header - prefix));
    final String padded = text + " ".repeat(header - prefix - text.length() - 1) + "\n";
    return buffer.put(padded.getBytes(StandardCharsets.US_ASCII));
  }

  /**
   * Reads a file.
   *
   * @throws FileContentException if it is no NPY file of real numbers in C order, little-endian, or
   *     is shorter or longer than its header says
   * @throws IOException if it cannot be read
   */
  public static NpyArray read(Path path) throws IOException {
    final String file = InputFiles.name(path);
    final ByteBuffer buffer =
        ByteBuffer.wrap(InputFiles.bytes(path)).order(ByteOrder.LITTLE_ENDIAN);
    final String header = header(buffer, file);
    refuseFortranOrder(header, file);
    final NpyType type = NpyType.of(field(DESCRIPTION, header, file), file);
    final int[] shape = shape(field(SHAPE, header, file), file);
    final long count = product(shape);
    if (count != buffer.remaining() / type.width() || buffer.remaining() % type.width() != 0) {
      throw new FileContentException(
          file,
          0,
          buffer.remaining() + " bytes of data",
          count + " numbers of " + type.width() + " bytes are needed, as the header says");
    }
    final double[] values = new double[(int) count];
    for (int i = 0; i < values.length; i++) {
      values[i] = type.next(buffer);
    }
    return new NpyArray(shape, values);
  }

  private static String header(ByteBuffer buffer, String file) throws FileContentException {
    final byte[] magic = new byte[MAGIC.length];
    if (buffer.remaining() >= MAGIC.length + 6) {
      buffer.get(magic);
    }
    if (!Arrays.equals(magic, MAGIC)) {
      throw new FileContentException(file, 0, "no NPY mark at the start", "an NPY file is needed");
    }
    final int version = buffer.get();
    buffer.get();
    if (version < 1 || version > 3) {
      throw new FileContentException(
          file, 0, "NPY version " + version, "version 1, 2 or 3 is needed");
    }
    final int length = version == 1 ? Short.toUnsignedInt(buffer.getShort()) : buffer.getInt();
    if (length < 0 || length > buffer.remaining()) {
      throw new FileContentException(
          file, 0, "a header cut short", "a complete NPY file is needed");
    }
    final byte[] text = new byte[length];
    buffer.get(text);
    return new String(text, StandardCharsets.UTF_8);
  }

  private static void refuseFortranOrder(String header, String file) throws FileContentException {
    if (field(FORTRAN, header, file).equals("True")) {
      throw new FileContentException(
          file, 0, "an array in Fortran order", "C order is needed (numpy.ascontiguousarray)");
    }
  }

  private static String field(Pattern pattern, String header, String file)
      throws FileContentException {
    final Matcher matcher = pattern.matcher(header);
    if (matcher.find()) {
      return matcher.group(1);
    }
    throw new FileContentException(
        file, 0, "the header " + header.strip(), "plain arrays of one number type are needed");
  }

  private static int[] shape(String axes, String file) throws FileContentException {
    try {
      return Arrays.stream(axes.split(","))
          .map(String::strip)
          .filter(axis -> !axis.isEmpty())
          .mapToInt(Integer::parseInt)
          .toArray();
    } catch (final NumberFormatException e) {
      throw new FileContentException(
          file, 0, "the shape (" + axes + ")", "axes below 2^31 are needed");
    }
  }

  /** The number of elements, or -1 where it is beyond a Java array. */
  private static long product(int[] shape) {
    long product = 1;
    for (final int length : shape) {
      product *= length;
      if (product < 0 || product > Integer.MAX_VALUE) {
        return -1;
      }
    }
    return product;
  }
}
