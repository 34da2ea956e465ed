package steelyard.harness.run;

import java.time.Duration;
import java.util.concurrent.atomic.AtomicReference;

/**
 * Watches the calls of one worker thread, so that another thread can take over when a call does not
 * return. Java cannot stop a thread; it can only stop waiting for it.
 */
final class Guard {

  private record Call(long startedNanos, long timeoutNanos, boolean abandoned) {}

  private static final Call ABANDONED = new Call(0, 0, true);

  private final AtomicReference<Call> current = new AtomicReference<>();

  /** Says that a call begins. Only the worker calls this. */
  void begin(Duration timeout) {
    current.set(new Call(System.nanoTime(), timeout.toNanos(), false));
  }

  /**
   * Says that the call has returned. Only the worker calls this.
   *
   * @return whether the worker still owns its work; if not, it must leave without a trace
   */
  boolean end() {
    return !current.getAndSet(null).abandoned();
  }

  /**
   * Takes the work away from the worker if its call is overdue.
   *
   * @return whether it was taken away by this call
   */
  boolean abandonIfOverdue() {
    Call call = current.get();
    return call != null
        && !call.abandoned()
        && System.nanoTime() - call.startedNanos() > call.timeoutNanos()
        && current.compareAndSet(call, ABANDONED);
  }
}
