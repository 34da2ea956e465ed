package steelyard.harness.data;

import java.nio.ByteBuffer;
import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.HexFormat;
import java.util.List;
import steelyard.problems.Data;

/**
 * A short fingerprint of an input: the first 16 hex digits of the SHA-256 of its parts' names,
 * shapes and bits. Inputs that differ in the sign of a zero differ here too; every NaN is the same.
 */
public final class DataDigest {

  private static final int HEX_DIGITS = 16;
  private static final byte VECTOR = 'v';
  private static final byte MATRIX = 'm';

  private final MessageDigest sha256;

  private DataDigest() {
    try {
      sha256 = MessageDigest.getInstance("SHA-256");
    } catch (NoSuchAlgorithmException e) {
      throw new IllegalStateException("every Java platform has SHA-256, this one does not", e);
    }
  }

  /** Returns the fingerprint of an input, in lower case. */
  public static String of(Data data) {
    return of(data.parts());
  }

  /** Returns the fingerprint of an input's parts, in lower case. */
  public static String of(List<Data.Part> parts) {
    DataDigest digest = new DataDigest();
    parts.forEach(digest::add);
    return HexFormat.of().formatHex(digest.sha256.digest()).substring(0, HEX_DIGITS);
  }

  private void add(Data.Part part) {
    if (part instanceof Data.Vector vector) {
      start(VECTOR, vector.name(), 1);
      add(vector.values());
    } else if (part instanceof Data.Matrix matrix) {
      start(MATRIX, matrix.name(), matrix.rows().length);
      for (double[] row : matrix.rows()) {
        add(row);
      }
    }
  }

  private void start(byte kind, String name, int rows) {
    byte[] text = name.getBytes(StandardCharsets.UTF_8);
    sha256.update(kind);
    sha256.update(ByteBuffer.allocate(Integer.BYTES).putInt(0, text.length));
    sha256.update(text);
    sha256.update(ByteBuffer.allocate(Integer.BYTES).putInt(0, rows));
  }

  private void add(double[] values) {
    ByteBuffer bits = ByteBuffer.allocate(Integer.BYTES + Double.BYTES * values.length);
    bits.putInt(values.length);
    for (double value : values) {
      // Which NaN an operation gives depends on how it was compiled.
      bits.putLong(Double.doubleToLongBits(value));
    }
    sha256.update(bits.flip());
  }
}
