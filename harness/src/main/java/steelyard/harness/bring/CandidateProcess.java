package steelyard.harness.bring;

import java.io.BufferedInputStream;
import java.io.BufferedOutputStream;
import java.io.DataInputStream;
import java.io.DataOutputStream;
import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.BlockingQueue;
import java.util.concurrent.LinkedBlockingQueue;
import java.util.concurrent.TimeUnit;
import steelyard.harness.plan.Addition;
import steelyard.harness.run.Mishap;
import steelyard.problems.Data;
import steelyard.results.Status;

/** A JVM in which one candidate runs, seen from the harness. */
final class CandidateProcess implements Servant {

  // The heap is bounded, so that a candidate that allocates without end does not take the machine
  // with it, and a crash leaves no files behind.
  private static final List<String> FLAGS =
      List.of(
          "-Xmx1g",
          "-XX:+UseSerialGC",
          "-XX:TieredStopAtLevel=1",
          "-XX:-CreateCoredumpOnCrash",
          "-XX:+SuppressFatalErrorMessage",
          "-Djava.awt.headless=true");

  private static final long LAST_BREATH_MS = 2000;

  private final Process process;
  private final DataOutputStream out;

  // Empty stands for the end of the stream.
  private final BlockingQueue<Optional<Message>> replies = new LinkedBlockingQueue<>();

  private boolean ready;
  private volatile boolean closed;

  private CandidateProcess(Process process) {
    this.process = process;
    out = new DataOutputStream(new BufferedOutputStream(process.getOutputStream()));
    Thread reader = new Thread(this::read, "steelyard-replies");
    reader.setDaemon(true);
    reader.start();
  }

  /**
   * Starts the JVM of a candidate, and does not wait until it is ready.
   *
   * @throws Mishap if it cannot be started
   */
  static CandidateProcess start(Addition addition) {
    String java = Path.of(System.getProperty("java.home"), "bin", "java").toString();
    List<String> command = new ArrayList<>(List.of(java));
    command.addAll(FLAGS);
    Bringing.jvmFlags(addition).forEach(command::add);
    command.addAll(
        List.of("-cp", System.getProperty("java.class.path"), CandidateJvm.class.getName()));
    try {
      Process process =
          new ProcessBuilder(command).redirectError(ProcessBuilder.Redirect.DISCARD).start();
      CandidateProcess started = new CandidateProcess(process);
      Message.candidate(addition).write(started.out);
      return started;
    } catch (IOException failed) {
      throw new Mishap(Status.CRASHED, "its JVM could not be started: " + failed.getMessage());
    }
  }

  @Override
  public void awaitReady() {
    if (!ready) {
      Message message = take();
      if (message.kind() != Message.Kind.READY) {
        throw message.mishap();
      }
      ready = true;
    }
  }

  @Override
  public double[] answer(List<Data.Part> parts) {
    try {
      Message.input(parts).write(out);
    } catch (IOException gone) {
      throw ended();
    }
    Message reply = take();
    return switch (reply.kind()) {
      case ANSWER -> vector(reply);
      case NOTHING -> null;
      case LAST_MISHAP -> {
        close();
        throw reply.mishap();
      }
      default -> throw reply.mishap();
    };
  }

  private double[] vector(Message reply) {
    try {
      return ((Data.Vector) reply.parts().get(0)).values();
    } catch (IOException wrong) {
      close();
      throw new Mishap(Status.CRASHED, "what its JVM sent was no answer");
    }
  }

  @Override
  public boolean isUsable() {
    return !closed && process.isAlive();
  }

  private Message take() {
    try {
      return replies.take().orElseThrow(this::ended);
    } catch (InterruptedException abandoned) {
      close();
      Thread.currentThread().interrupt();
      throw new Mishap(Status.TIMEOUT, "its JVM was ended, because nobody waits for it any more");
    }
  }

  private Mishap ended() {
    try {
      if (process.waitFor(LAST_BREATH_MS, TimeUnit.MILLISECONDS)) {
        return new Mishap(Status.CRASHED, "its JVM ended with exit code " + process.exitValue());
      }
    } catch (InterruptedException abandoned) {
      Thread.currentThread().interrupt();
    }
    close();
    return new Mishap(Status.CRASHED, "its JVM sent what is no answer");
  }

  private void read() {
    try (DataInputStream in =
        new DataInputStream(new BufferedInputStream(process.getInputStream()))) {
      while (true) {
        replies.add(Optional.of(Message.read(in)));
      }
    } catch (IOException ended) {
      replies.add(Optional.empty());
    }
  }

  @Override
  public void close() {
    closed = true;
    ProcessTree.end(process);
  }
}
