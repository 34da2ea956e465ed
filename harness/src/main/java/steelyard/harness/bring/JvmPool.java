package steelyard.harness.bring;

import java.util.ArrayDeque;
import java.util.Deque;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.function.Function;
import steelyard.harness.plan.Addition;
import steelyard.problems.Data;

/**
 * The JVMs of one candidate: as many as threads want an answer at a time. One that ended is
 * replaced when it is missed, so that each call finds the candidate alive.
 */
final class JvmPool implements Function<List<Data.Part>, double[]>, AutoCloseable {
  private final Addition addition;
  private final Deque<CandidateProcess> idle = new ArrayDeque<>();
  private final Set<CandidateProcess> all = new HashSet<>();
  private boolean closed;

  JvmPool(Addition addition) {
    this.addition = addition;
  }

  /** Starts JVMs in advance, so that the first calls hardly wait for them. */
  synchronized void fill(int count) {
    while (all.size() < count) {
      CandidateProcess process = CandidateProcess.start(addition);
      all.add(process);
      idle.add(process);
    }
  }

  @Override
  public double[] apply(List<Data.Part> parts) {
    CandidateProcess process = take();
    try {
      process.awaitReady();
      return process.answer(parts);
    } finally {
      giveBack(process);
    }
  }

  private synchronized CandidateProcess take() {
    if (closed) {
      throw new IllegalStateException("the candidate's JVMs are closed");
    }
    while (!idle.isEmpty()) {
      CandidateProcess process = idle.pop();
      if (process.isUsable()) {
        return process;
      }
      all.remove(process);
    }
    CandidateProcess process = CandidateProcess.start(addition);
    all.add(process);
    return process;
  }

  private void giveBack(CandidateProcess process) {
    synchronized (this) {
      if (!closed && process.isUsable()) {
        idle.push(process);
        return;
      }
      all.remove(process);
    }
    process.close();
  }

  /** Ends all of them. */
  @Override
  public synchronized void close() {
    closed = true;
    all.forEach(CandidateProcess::close);
    all.clear();
    idle.clear();
  }
}
