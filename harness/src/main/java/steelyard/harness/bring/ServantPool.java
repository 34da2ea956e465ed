package steelyard.harness.bring;

import java.util.ArrayDeque;
import java.util.Deque;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.function.Function;
import java.util.function.Supplier;
import steelyard.harness.run.Mishap;
import steelyard.problems.Data;
import steelyard.results.Status;

/**
 * The processes of one candidate: as many as threads want an answer at a time. One that ended is
 * replaced when it is missed, so that each call finds the candidate alive.
 */
final class ServantPool implements Function<List<Data.Part>, double[]>, AutoCloseable {
  private final Supplier<? extends Servant> starter;
  private final Deque<Servant> idle = new ArrayDeque<>();
  private final Set<Servant> all = new HashSet<>();
  private final Set<Servant> experienced = new HashSet<>();
  private boolean closed;

  ServantPool(Supplier<? extends Servant> starter) {
    this.starter = starter;
  }

  /** Starts processes in advance, so that the first calls hardly wait for them. */
  synchronized void fill(int count) {
    while (all.size() < count) {
      Servant process = starter.get();
      all.add(process);
      idle.add(process);
    }
  }

  @Override
  public double[] apply(List<Data.Part> parts) {
    Servant process = take();
    boolean isFresh = !isExperienced(process);
    try {
      return answer(process, parts);
    } catch (Mishap mishap) {
      // What an earlier problem did to a process is not held against this one.
      if (mishap.status() != Status.CRASHED || isFresh) {
        throw mishap;
      }
      return answer(started(), parts);
    }
  }

  private double[] answer(Servant process, List<Data.Part> parts) {
    try {
      process.awaitReady();
      double[] answer = process.answer(parts);
      addExperience(process);
      return answer;
    } finally {
      giveBack(process);
    }
  }

  private synchronized boolean isExperienced(Servant process) {
    return experienced.contains(process);
  }

  private synchronized void addExperience(Servant process) {
    experienced.add(process);
  }

  private synchronized Servant take() {
    if (closed) {
      throw new IllegalStateException("the candidate's processes are ended");
    }
    while (!idle.isEmpty()) {
      Servant process = idle.pop();
      if (process.isUsable()) {
        return process;
      }
      all.remove(process);
      experienced.remove(process);
    }
    return started();
  }

  private synchronized Servant started() {
    Servant process = starter.get();
    all.add(process);
    return process;
  }

  private void giveBack(Servant process) {
    synchronized (this) {
      if (!closed && process.isUsable()) {
        idle.push(process);
        return;
      }
      all.remove(process);
      experienced.remove(process);
    }
    process.close();
  }

  /** Ends all of them. */
  @Override
  public synchronized void close() {
    closed = true;
    idle.forEach(Servant::askToLeave);
    all.forEach(Servant::close);
    all.clear();
    idle.clear();
    experienced.clear();
  }
}
