package steelyard.harness.run;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Iterator;
import java.util.List;
import java.util.Queue;
import java.util.concurrent.atomic.AtomicReference;
import steelyard.results.Observation;

/**
 * Tries every candidate on every problem, on several threads. Each problem's rows depend on that
 * problem alone and are returned in the order of the assignments, so that the number of threads
 * never shows.
 */
public final class AccuracyPhase {

  private static final long WATCH_MILLIS = 20;
  private static final long LAST_BREATH_MILLIS = 2000;
  private static final String NAME = "accuracy";

  private final int threads;
  private final Progress progress;
  private final Interruption interruption;

  /**
   * Prepares the phase.
   *
   * @param threads how many problems to work on at a time, at least 1
   * @param progress hears of each finished problem
   * @param interruption asks to stop early
   */
  public AccuracyPhase(int threads, Progress progress, Interruption interruption) {
    if (threads < 1) {
      throw new IllegalArgumentException("threads must be at least 1, found " + threads);
    }
    this.threads = threads;
    this.progress = progress;
    this.interruption = interruption;
  }

  /**
   * What the phase found.
   *
   * @param observations the rows of all finished problems, in the order of the assignments
   * @param complete whether every problem was finished
   * @param strayCalls how many calls never returned and still occupy a thread
   */
  public record Outcome(List<Observation> observations, boolean complete, int strayCalls) {}

  /** Tries every candidate on every problem. */
  public Outcome run(List<Assignment<?, ?>> assignments) {
    return new Crew(assignments).work();
  }

  /** The workers of one run and the watch over them; all fields are guarded by its monitor. */
  private final class Crew {
    private final List<Trials<?, ?>> all = new ArrayList<>();
    private final Queue<Trials<?, ?>> waiting = new ArrayDeque<>();
    private final List<Worker> workers = new ArrayList<>();
    private final AtomicReference<Throwable> fault = new AtomicReference<>();
    private int finished;
    private final List<Thread> abandoned = new ArrayList<>();
    private int active;

    Crew(List<Assignment<?, ?>> assignments) {
      assignments.forEach(assignment -> all.add(new Trials<>(assignment)));
      waiting.addAll(all);
    }

    synchronized Outcome work() {
      for (int i = 0; i < threads; i++) {
        start(null);
      }
      while (active > 0) {
        try {
          wait(WATCH_MILLIS);
        } catch (InterruptedException interrupted) {
          interruption.request();
        }
        replaceOverdue();
      }
      rethrowFault();
      List<Observation> rows = new ArrayList<>();
      all.stream()
          .filter(trials -> trials.rows().size() == trials.assignment().candidates().size())
          .forEach(trials -> rows.addAll(trials.rows()));
      return new Outcome(List.copyOf(rows), finished == all.size(), strayCalls());
    }

    // A call into another JVM ends when its thread is interrupted; any other goes on.
    private int strayCalls() {
      int count = 0;
      for (Thread thread : abandoned) {
        try {
          thread.join(LAST_BREATH_MILLIS);
        } catch (InterruptedException interrupted) {
          interruption.request();
        }
        count += thread.isAlive() ? 1 : 0;
      }
      return count;
    }

    private void rethrowFault() {
      Throwable thrown = fault.get();
      if (thrown instanceof RuntimeException unexpected) {
        throw unexpected;
      }
      if (thrown instanceof Error error) {
        throw error;
      }
    }

    private void start(Trials<?, ?> unfinished) {
      Worker worker = new Worker(this, unfinished);
      workers.add(worker);
      active++;
      worker.thread.start();
    }

    private void replaceOverdue() {
      List<Trials<?, ?>> orphans = new ArrayList<>();
      for (Iterator<Worker> each = workers.iterator(); each.hasNext(); ) {
        Worker worker = each.next();
        if (worker.guard.abandonIfOverdue()) {
          each.remove();
          active--;
          abandoned.add(worker.thread);
          worker.thread.interrupt();
          orphans.add(worker.trials);
        }
      }
      for (Trials<?, ?> trials : orphans) {
        trials.recordTimeout();
        start(trials);
      }
    }

    private synchronized Trials<?, ?> next(Worker worker) {
      Trials<?, ?> trials = interruption.requested() || fault.get() != null ? null : waiting.poll();
      worker.trials = trials;
      return trials;
    }

    private synchronized void finished(Trials<?, ?> trials) {
      finished++;
      progress.step(NAME, trials.assignment().id().toString(), finished, all.size());
    }

    private synchronized void leave(Worker worker) {
      workers.remove(worker);
      active--;
      notifyAll();
    }
  }

  private static final class Worker implements Runnable {
    private final Crew crew;
    private final Guard guard = new Guard();
    private final Thread thread;
    private volatile Trials<?, ?> trials;

    Worker(Crew crew, Trials<?, ?> unfinished) {
      this.crew = crew;
      this.trials = unfinished;
      this.thread = new Thread(this, "steelyard-accuracy");
      thread.setDaemon(true);
    }

    @Override
    public void run() {
      try {
        Trials<?, ?> current = trials != null ? trials : crew.next(this);
        while (current != null) {
          if (!current.proceed(guard)) {
            return;
          }
          crew.finished(current);
          current = crew.next(this);
        }
      } catch (RuntimeException | Error unexpected) {
        crew.fault.compareAndSet(null, unexpected);
      }
      crew.leave(this);
    }
  }
}
