package steelyard.harness.cli;

import java.util.concurrent.CountDownLatch;
import java.util.concurrent.TimeUnit;
import steelyard.harness.run.Interruption;

/**
 * Turns an interrupt of the process (Ctrl-C, or a polite kill) into a request to stop, and waits
 * for what is complete to be written before the process goes.
 */
final class InterruptWatch implements AutoCloseable {

  private static final long PATIENCE_SECONDS = 60;

  private final Interruption interruption = new Interruption();
  private final CountDownLatch written = new CountDownLatch(1);
  private final Thread hook = new Thread(this::stop, "steelyard-interrupt");

  InterruptWatch() {
    Runtime.getRuntime().addShutdownHook(hook);
  }

  Interruption interruption() {
    return interruption;
  }

  /** Says that everything is written and the process may end. */
  @Override
  public void close() {
    written.countDown();
    try {
      Runtime.getRuntime().removeShutdownHook(hook);
    } catch (IllegalStateException alreadyGoing) {
      return;
    }
  }

  @SuppressWarnings("SystemExitOutsideMain")
  private void stop() {
    interruption.request();
    try {
      written.await(PATIENCE_SECONDS, TimeUnit.SECONDS);
    } catch (InterruptedException impatient) {
      Thread.currentThread().interrupt();
    }
    Runtime.getRuntime().halt(ExitCode.INCOMPLETE);
  }
}
