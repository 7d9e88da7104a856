package torqueloom.model.table;

import java.nio.ByteBuffer;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.StandardCharsets;

/** Bytes to text, strictly: nothing is replaced silently. */
final class Utf8 {
  private static final String BYTE_ORDER_MARK = "\uFEFF";

  private Utf8() {}

  /**
   * Decodes UTF-8 and drops a byte order mark.
   *
   * @param file what the message calls the source
   * @throws FileContentException if the bytes are no UTF-8
   */
  static String decode(byte[] bytes, String file) throws FileContentException {
    try {
      final String text =
          StandardCharsets.UTF_8.newDecoder().decode(ByteBuffer.wrap(bytes)).toString();
      return text.startsWith(BYTE_ORDER_MARK) ? text.substring(1) : text;
    } catch (final CharacterCodingException e) {
      throw new FileContentException(
          file, 0, "bytes that are no UTF-8 text", "a text file in UTF-8 is needed");
    }
  }
}
