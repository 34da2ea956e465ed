package steelyard.harness.bring;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.DataInputStream;
import java.io.DataOutputStream;
import java.io.EOFException;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import steelyard.harness.data.DataFile;
import steelyard.harness.plan.Addition;
import steelyard.harness.run.Mishap;
import steelyard.problems.Data;
import steelyard.results.Status;

/**
 * The messages between the harness and the JVM of a candidate, each a kind, a length and so many
 * bytes.
 *
 * @param kind what it is
 * @param content its bytes
 */
record Message(Kind kind, byte[] content) {

  /** What a message is. */
  enum Kind {
    /** To the candidate's JVM, first: which candidate. */
    CANDIDATE('c'),
    /** To the candidate's JVM: an input. */
    INPUT('i'),
    /** From it, first: the kernel is made. */
    READY('r'),
    /** From it: an answer. */
    ANSWER('a'),
    /** From it: the answer null. */
    NOTHING('n'),
    /** From it: a status, and why. */
    MISHAP('m'),
    /** From it: the same, and it ends now, because it may be damaged. */
    LAST_MISHAP('l');

    private final char letter;

    Kind(char letter) {
      this.letter = letter;
    }

    static Optional<Kind> of(int letter) {
      return Arrays.stream(values()).filter(kind -> kind.letter == letter).findFirst();
    }
  }

  private static final int MAGIC = 0x53_54_59_00;
  private static final int LARGEST = 1 << 30;

  static Message candidate(Addition addition) throws IOException {
    ByteArrayOutputStream bytes = new ByteArrayOutputStream();
    DataOutputStream out = new DataOutputStream(bytes);
    out.writeUTF(addition.task());
    out.writeUTF(addition.id());
    out.writeUTF(addition.use());
    out.writeInt(addition.jars().size());
    for (String jar : addition.jars()) {
      out.writeUTF(jar);
    }
    return new Message(Kind.CANDIDATE, bytes.toByteArray());
  }

  Addition candidate() throws IOException {
    DataInputStream in = new DataInputStream(new ByteArrayInputStream(content));
    String task = in.readUTF();
    String id = in.readUTF();
    String use = in.readUTF();
    String[] jars = new String[in.readInt()];
    for (int i = 0; i < jars.length; i++) {
      jars[i] = in.readUTF();
    }
    return new Addition(task, id, use, List.of(jars));
  }

  static Message input(List<Data.Part> parts) {
    return new Message(Kind.INPUT, DataFile.bytes(parts));
  }

  static Message answer(double[] answer) {
    return answer == null
        ? new Message(Kind.NOTHING, new byte[0])
        : new Message(Kind.ANSWER, DataFile.bytes(List.of(new Data.Vector("answer", answer))));
  }

  static Message mishap(Kind kind, Status status, String detail) {
    String text = status.name() + "\n" + detail;
    return new Message(kind, text.getBytes(StandardCharsets.UTF_8));
  }

  List<Data.Part> parts() throws IOException {
    return DataFile.parse("a message", content);
  }

  Mishap mishap() {
    String text = new String(content, StandardCharsets.UTF_8);
    int end = text.indexOf('\n');
    return new Mishap(Status.valueOf(text.substring(0, end)), text.substring(end + 1));
  }

  void write(DataOutputStream out) throws IOException {
    out.writeInt(MAGIC + kind.letter);
    out.writeInt(content.length);
    out.write(content);
    out.flush();
  }

  /**
   * Reads a message.
   *
   * @throws EOFException if there is none any more
   * @throws IOException if what comes is none
   */
  static Message read(DataInputStream in) throws IOException {
    Optional<Kind> kind = Kind.of(in.readInt() - MAGIC);
    int length = in.readInt();
    if (kind.isEmpty() || length < 0 || length > LARGEST) {
      throw new IOException("this is no message");
    }
    byte[] content = in.readNBytes(length);
    if (content.length < length) {
      throw new EOFException();
    }
    return new Message(kind.get(), content);
  }
}
