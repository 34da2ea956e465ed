package steelyard.harness.cli;

import java.io.PrintWriter;
import java.util.Locale;
import java.util.function.LongSupplier;
import steelyard.harness.run.Progress;

/**
 * Tells how far a run has come: one line that rewrites itself on a terminal, a plain line every few
 * seconds elsewhere. The time left is a guess from the steps so far.
 */
final class ProgressReport implements Progress {

  private static final long PLAIN_INTERVAL_MS = 5_000;
  private static final long TERMINAL_INTERVAL_MS = 100;
  private static final long LEAST_FOR_A_GUESS_MS = 2_000;
  private static final int WIDTH = 100;

  private final PrintWriter err;
  private final boolean terminal;
  private final LongSupplier clockMillis;
  private String phase = "";
  private long phaseStarted;
  private long lastPrinted;

  ProgressReport(PrintWriter err, boolean terminal, LongSupplier clockMillis) {
    this.err = err;
    this.terminal = terminal;
    this.clockMillis = clockMillis;
  }

  @Override
  public synchronized void step(String currentPhase, String current, int done, int total) {
    long now = clockMillis.getAsLong();
    boolean first = !currentPhase.equals(phase);
    if (first) {
      phase = currentPhase;
      phaseStarted = now;
    }
    boolean last = done >= total;
    long interval = terminal ? TERMINAL_INTERVAL_MS : PLAIN_INTERVAL_MS;
    if (first || last || now - lastPrinted >= interval) {
      lastPrinted = now;
      print(line(current, done, total, now - phaseStarted), last);
    }
  }

  private String line(String current, int done, int total, long elapsedMs) {
    StringBuilder line = new StringBuilder();
    line.append(phase).append(' ').append(done).append(" of ").append(total);
    if (elapsedMs >= LEAST_FOR_A_GUESS_MS && done > 0 && done < total) {
      line.append(", about ").append(duration(elapsedMs * (total - done) / done)).append(" left");
    } else if (done >= total) {
      line.append(", took ").append(duration(elapsedMs));
    }
    if (!current.isEmpty() && done < total) {
      line.append(": ").append(current);
    }
    return line.length() > WIDTH ? line.substring(0, WIDTH) : line.toString();
  }

  private void print(String line, boolean last) {
    if (terminal) {
      err.print("\r\u001b[K" + line + (last ? System.lineSeparator() : ""));
    } else {
      err.println(line);
    }
    err.flush();
  }

  private static String duration(long millis) {
    long seconds = (millis + 500) / 1000;
    return seconds < 60
        ? seconds + " s"
        : String.format(Locale.ROOT, "%d min %02d s", seconds / 60, seconds % 60);
  }
}
