package steelyard.harness.data;

import java.io.BufferedOutputStream;
import java.io.ByteArrayOutputStream;
import java.io.DataOutputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.io.UncheckedIOException;
import java.nio.BufferUnderflowException;
import java.nio.ByteBuffer;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import steelyard.problems.Data;

/**
 * An input in a file, bit for bit: how another JVM gets it. Big-endian: magic, version, number of
 * parts; then of each part its kind, the length and UTF-8 bytes of its name, rows, columns, and raw
 * bits by rows.
 */
public final class DataFile {

  private static final int MAGIC = 0x53_54_4c_59;
  private static final int VERSION = 1;
  private static final byte VECTOR = 'v';
  private static final byte MATRIX = 'm';

  private DataFile() {}

  /**
   * Writes an input.
   *
   * @throws IllegalArgumentException if the rows of a matrix differ in length
   * @throws IOException if it cannot be written
   */
  public static void write(Path file, List<Data.Part> parts) throws IOException {
    try (OutputStream out = new BufferedOutputStream(Files.newOutputStream(file))) {
      write(out, parts);
    }
  }

  /**
   * Returns what a file with an input would hold.
   *
   * @throws IllegalArgumentException if the rows of a matrix differ in length
   */
  public static byte[] bytes(List<Data.Part> parts) {
    ByteArrayOutputStream out = new ByteArrayOutputStream();
    try {
      write(out, parts);
    } catch (IOException impossible) {
      throw new UncheckedIOException(impossible);
    }
    return out.toByteArray();
  }

  private static void write(OutputStream stream, List<Data.Part> parts) throws IOException {
    DataOutputStream out = new DataOutputStream(stream);
    out.writeInt(MAGIC);
    out.writeInt(VERSION);
    out.writeInt(parts.size());
    for (Data.Part part : parts) {
      write(out, part);
    }
    out.flush();
  }

  /**
   * Reads an input.
   *
   * @throws IOException if it cannot be read, or is not whole, or not such a file
   */
  public static List<Data.Part> read(Path file) throws IOException {
    return parse(file.toString(), Files.readAllBytes(file));
  }

  /**
   * Reads an input from the bytes of a file.
   *
   * @param name what to call it in messages
   * @throws IOException if it is not whole, or no such file
   */
  public static List<Data.Part> parse(String name, byte[] bytes) throws IOException {
    ByteBuffer in = ByteBuffer.wrap(bytes);
    try {
      if (in.getInt() != MAGIC || in.getInt() != VERSION) {
        throw new IOException(name + " is not a data file of version " + VERSION);
      }
      int count = in.getInt();
      List<Data.Part> parts = new ArrayList<>();
      for (int i = 0; i < count; i++) {
        parts.add(part(in));
      }
      if (in.hasRemaining()) {
        throw new IOException(name + " goes on after its last part, at byte " + in.position());
      }
      return List.copyOf(parts);
    } catch (BufferUnderflowException e) {
      throw new IOException(name + " ends before its last part does", e);
    }
  }

  private static void write(DataOutputStream out, Data.Part part) throws IOException {
    boolean isMatrix = part instanceof Data.Matrix;
    double[][] rows = rows(part);
    int columns = rows.length == 0 ? 0 : rows[0].length;
    byte[] name = part.name().getBytes(StandardCharsets.UTF_8);
    out.writeByte(isMatrix ? MATRIX : VECTOR);
    out.writeInt(name.length);
    out.write(name);
    out.writeInt(rows.length);
    out.writeInt(columns);
    for (double[] row : rows) {
      if (row.length != columns) {
        throw new IllegalArgumentException(
            "the rows of matrix '" + part.name() + "' must have one length");
      }
      for (double value : row) {
        out.writeLong(Double.doubleToRawLongBits(value));
      }
    }
  }

  private static double[][] rows(Data.Part part) {
    return part instanceof Data.Matrix matrix
        ? matrix.rows()
        : new double[][] {((Data.Vector) part).values()};
  }

  private static Data.Part part(ByteBuffer in) throws IOException {
    byte kind = in.get();
    byte[] name = new byte[available(in, in.getInt(), 1)];
    in.get(name);
    int rowCount = in.getInt();
    int columns = in.getInt();
    available(in, (long) rowCount * columns, Double.BYTES);
    double[][] rows = new double[available(in, rowCount, columns == 0 ? 0 : 1)][columns];
    for (double[] row : rows) {
      for (int j = 0; j < columns; j++) {
        row[j] = Double.longBitsToDouble(in.getLong());
      }
    }
    String text = new String(name, StandardCharsets.UTF_8);
    if (kind == MATRIX) {
      return new Data.Matrix(text, rows);
    }
    if (kind == VECTOR && rowCount == 1) {
      return new Data.Vector(text, rows[0]);
    }
    throw new IOException("part '" + text + "' is neither a vector nor a matrix");
  }

  /** Returns the count if so many items are there: a wrong count must not ask for memory. */
  private static int available(ByteBuffer in, long count, int bytesEach) {
    if (count < 0 || count > Integer.MAX_VALUE || count * bytesEach > in.remaining()) {
      throw new BufferUnderflowException();
    }
    return (int) count;
  }
}
