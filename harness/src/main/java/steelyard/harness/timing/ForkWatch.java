package steelyard.harness.timing;

import java.time.Duration;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.TimeUnit;

/**
 * Ends the JVMs in which JMH measures when they take longer than any measurement can: JMH waits for
 * a call that never returns as long as that takes.
 */
final class ForkWatch implements AutoCloseable {
  private static final String FORK = "org.openjdk.jmh.runner.ForkedMain";

  private final CountDownLatch done = new CountDownLatch(1);
  private volatile boolean fired;

  ForkWatch(Duration limit) {
    Thread watch = new Thread(() -> watch(limit), "steelyard-fork-watch");
    watch.setDaemon(true);
    watch.start();
  }

  private void watch(Duration limit) {
    try {
      if (!done.await(limit.toMillis(), TimeUnit.MILLISECONDS)) {
        fired = true;
        ProcessHandle.current()
            .descendants()
            .filter(each -> each.info().commandLine().orElse("").contains(FORK))
            .forEach(ProcessHandle::destroyForcibly);
      }
    } catch (InterruptedException never) {
      Thread.currentThread().interrupt();
    }
  }

  /** Says whether it had to end them. */
  boolean hasFired() {
    return fired;
  }

  @Override
  public void close() {
    done.countDown();
  }
}
