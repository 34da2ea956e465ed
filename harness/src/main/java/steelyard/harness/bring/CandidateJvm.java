package steelyard.harness.bring;

import java.io.BufferedInputStream;
import java.io.BufferedOutputStream;
import java.io.DataInputStream;
import java.io.DataOutputStream;
import java.io.FileDescriptor;
import java.io.FileInputStream;
import java.io.FileOutputStream;
import java.io.IOException;
import java.io.InputStream;
import java.io.OutputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.concurrent.BlockingQueue;
import java.util.concurrent.LinkedBlockingQueue;
import steelyard.harness.data.PartsCopy;
import steelyard.harness.plan.Addition;
import steelyard.harness.run.Attempt;
import steelyard.harness.task.Task;
import steelyard.problems.Data;
import steelyard.results.Status;

/**
 * The program that runs in the JVM of a candidate: it takes inputs and gives answers over its
 * standard streams, which the candidate itself does not get to see. It ends when its input does,
 * also while the candidate is at work, so that none outlives the harness.
 */
public final class CandidateJvm {
  private final DataOutputStream out;
  private final BlockingQueue<Message> messages = new LinkedBlockingQueue<>();

  private CandidateJvm(DataOutputStream out) {
    this.out = out;
  }

  /** Serves until the input ends. */
  public static void main(String[] arguments) throws IOException, InterruptedException {
    DataOutputStream out =
        new DataOutputStream(new BufferedOutputStream(new FileOutputStream(FileDescriptor.out)));
    DataInputStream in =
        new DataInputStream(new BufferedInputStream(new FileInputStream(FileDescriptor.in)));
    PrintStream nowhere =
        new PrintStream(OutputStream.nullOutputStream(), false, StandardCharsets.UTF_8);
    System.setOut(nowhere);
    System.setErr(nowhere);
    System.setIn(InputStream.nullInputStream());
    CandidateJvm jvm = new CandidateJvm(out);
    Thread listener = new Thread(() -> jvm.listen(in), "steelyard-listener");
    listener.setDaemon(true);
    listener.start();
    jvm.serve();
  }

  private void listen(DataInputStream in) {
    try {
      while (true) {
        messages.add(Message.read(in));
      }
    } catch (IOException | OutOfMemoryError ended) {
      Runtime.getRuntime().halt(0);
    }
  }

  private void serve() throws IOException, InterruptedException {
    Addition addition = messages.take().candidate();
    serve(Bringing.taskNamed(addition.task()), addition);
  }

  private <K, D extends Data> void serve(Task<K, D> task, Addition addition)
      throws IOException, InterruptedException {
    K kernel;
    try {
      kernel = Bringing.kernel(task, addition, false);
    } catch (Throwable thrown) {
      Message.mishap(Message.Kind.LAST_MISHAP, Status.EXCEPTION, reason(thrown)).write(out);
      Runtime.getRuntime().halt(0);
      return;
    }
    new Message(Message.Kind.READY, new byte[0]).write(out);
    while (true) {
      Message reply = reply(task, kernel, messages.take().parts());
      reply.write(out);
      if (reply.kind() == Message.Kind.LAST_MISHAP) {
        Runtime.getRuntime().halt(0);
      }
    }
  }

  private static <K, D extends Data> Message reply(
      Task<K, D> task, K kernel, List<Data.Part> parts) {
    try {
      D copy = task.data(PartsCopy.of(parts));
      double[] answer = task.apply(kernel, copy);
      return PartsCopy.sameBits(parts, copy.parts())
          ? Message.answer(answer)
          : Message.mishap(Message.Kind.MISHAP, Status.MODIFIED_INPUT, Attempt.MODIFIED);
    } catch (VirtualMachineError thrown) {
      return Message.mishap(Message.Kind.LAST_MISHAP, Status.EXCEPTION, Attempt.describe(thrown));
    } catch (Throwable thrown) {
      return Message.mishap(Message.Kind.MISHAP, Status.EXCEPTION, Attempt.describe(thrown));
    }
  }

  private static String reason(Throwable thrown) {
    return thrown instanceof BringException ? thrown.getMessage() : Attempt.describe(thrown);
  }
}
