package steelyard.harness.bring;

import java.io.BufferedWriter;
import java.io.IOException;
import java.io.InputStream;
import java.io.OutputStreamWriter;
import java.io.Writer;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Optional;
import java.util.OptionalLong;
import java.util.concurrent.ArrayBlockingQueue;
import java.util.concurrent.BlockingQueue;
import java.util.concurrent.LinkedBlockingQueue;
import java.util.concurrent.TimeUnit;
import steelyard.harness.run.Mishap;
import steelyard.problems.Data;
import steelyard.results.Status;

/**
 * A program in any language that answers problems over its standard streams, as {@code
 * harness/PROTOCOL.md} describes. It is written to, read from and listened to by threads of their
 * own, so that one that reads nothing, or floods its output, holds nobody up.
 */
final class ProgramProcess implements Servant {
  private static final int LINES_AHEAD = 1024;
  private static final long LAST_BREATH_MS = 2000;
  private static final long LAST_WORDS_MS = 300;
  private static final long FAREWELL_MS = 500;
  private static final String END_OF_INPUT = "";

  private final Process process;
  private final BlockingQueue<String> requests = new LinkedBlockingQueue<>();

  // Empty stands for the end of the stream.
  private final BlockingQueue<Optional<String>> lines = new ArrayBlockingQueue<>(LINES_AHEAD);
  private final Thread reader;
  private final Thread complaints;
  private volatile String lastComplaint = "";
  private boolean ready;
  private volatile boolean closed;
  private OptionalLong leaveBy = OptionalLong.empty();
  private long problems;

  private ProgramProcess(Process process) {
    this.process = process;
    thread("steelyard-program-input", this::write);
    reader = thread("steelyard-program-output", this::read);
    complaints = thread("steelyard-program-errors", this::listen);
    thread("steelyard-program-end", this::watch);
  }

  /**
   * Starts a program, and does not wait until it is ready.
   *
   * @throws Mishap if it cannot be started
   */
  static ProgramProcess start(String task, List<String> command) {
    try {
      ProcessBuilder builder = new ProcessBuilder(command);
      // A user's decimal comma would garble a good answer.
      builder.environment().put("LC_ALL", "C");
      ProgramProcess started = new ProgramProcess(builder.start());
      started.requests.add(ProgramText.greeting(task));
      return started;
    } catch (IOException failed) {
      throw new Mishap(Status.CRASHED, "the program could not be started: " + failed.getMessage());
    }
  }

  @Override
  public void awaitReady() {
    if (!ready) {
      String line = line();
      if (!ProgramText.isGreeting(line)) {
        throw garbled("it says '" + line + "', not '" + ProgramText.GREETING + "'");
      }
      ready = true;
    }
  }

  @Override
  public double[] answer(List<Data.Part> parts) {
    problems++;
    requests.add(ProgramText.problem(problems, parts));
    ProgramText.Header header;
    try {
      header = ProgramText.header(line(), problems);
    } catch (ProgramText.GarbledException wrong) {
      throw garbled(wrong.getMessage());
    }
    if (header.complaint().isPresent()) {
      throw new Mishap(Status.EXCEPTION, header.complaint().get());
    }
    double[] answer = new double[header.count()];
    int filled = 0;
    while (filled < answer.length) {
      try {
        filled = ProgramText.numbers(line(), answer, filled);
      } catch (ProgramText.GarbledException wrong) {
        throw garbled(wrong.getMessage());
      }
    }
    return answer;
  }

  @Override
  public boolean isUsable() {
    return !closed && process.isAlive();
  }

  @Override
  public void askToLeave() {
    leaveBy = OptionalLong.of(System.nanoTime() + TimeUnit.MILLISECONDS.toNanos(FAREWELL_MS));
    requests.add(END_OF_INPUT);
  }

  @Override
  public void close() {
    closed = true;
    if (leaveBy.isPresent()) {
      try {
        process.waitFor(leaveBy.getAsLong() - System.nanoTime(), TimeUnit.NANOSECONDS);
      } catch (InterruptedException impatient) {
        Thread.currentThread().interrupt();
      }
    }
    ProcessTree.end(process);
    // It may wait for somebody to take what a flood left.
    reader.interrupt();
  }

  private Mishap garbled(String what) {
    close();
    return new Mishap(Status.MALFORMED, "the program does not keep to the protocol: " + what);
  }

  private String line() {
    try {
      return lines.take().orElseThrow(this::ended);
    } catch (InterruptedException abandoned) {
      close();
      Thread.currentThread().interrupt();
      throw new Mishap(
          Status.TIMEOUT, "the program was ended, because nobody waits for it any more");
    }
  }

  private Mishap ended() {
    try {
      if (process.waitFor(LAST_BREATH_MS, TimeUnit.MILLISECONDS)) {
        complaints.join(LAST_WORDS_MS);
        return new Mishap(
            Status.CRASHED,
            "the program ended with exit code "
                + process.exitValue()
                + (lastComplaint.isEmpty() ? "" : ": " + lastComplaint));
      }
    } catch (InterruptedException abandoned) {
      Thread.currentThread().interrupt();
    }
    close();
    return new Mishap(Status.CRASHED, "the program closed its output");
  }

  private void write() {
    try (Writer out =
        new BufferedWriter(
            new OutputStreamWriter(process.getOutputStream(), StandardCharsets.US_ASCII))) {
      while (process.isAlive()) {
        String request = requests.poll(LAST_BREATH_MS, TimeUnit.MILLISECONDS);
        if (END_OF_INPUT.equals(request)) {
          return;
        }
        if (request != null) {
          out.write(request);
          out.flush();
        }
      }
    } catch (IOException gone) {
      // The reader notices that it ended.
    } catch (InterruptedException never) {
      Thread.currentThread().interrupt();
    }
  }

  private void read() {
    try (InputStream in = process.getInputStream()) {
      BoundedLines reader = new BoundedLines(in);
      for (Optional<String> line = reader.next(); line.isPresent(); line = reader.next()) {
        lines.put(line);
      }
      lines.put(Optional.empty());
    } catch (IOException gone) {
      lines.offer(Optional.empty());
    } catch (InterruptedException closing) {
      Thread.currentThread().interrupt();
    }
  }

  // What it leaves behind may keep its output open.
  private void watch() {
    try {
      process.waitFor();
      TimeUnit.MILLISECONDS.sleep(LAST_WORDS_MS);
      lines.offer(Optional.empty());
    } catch (InterruptedException never) {
      Thread.currentThread().interrupt();
    }
  }

  private void listen() {
    try (InputStream in = process.getErrorStream()) {
      BoundedLines reader = new BoundedLines(in);
      for (Optional<String> line = reader.next(); line.isPresent(); line = reader.next()) {
        if (!line.get().isBlank()) {
          lastComplaint = line.get().strip();
        }
      }
    } catch (IOException gone) {
      // What was said so far remains.
    }
  }

  private static Thread thread(String name, Runnable work) {
    Thread thread = new Thread(work, name);
    thread.setDaemon(true);
    thread.start();
    return thread;
  }
}
