package steelyard.harness.bring;

import java.lang.reflect.Method;
import java.util.Optional;
import steelyard.algorithms.Candidate;

/**
 * Code that fits a task.
 *
 * @param type its class, not initialized
 * @param method its method; empty where the class implements the task's interface
 * @param precisionBits the precision in which it computes
 */
record FoundCode(Class<?> type, Optional<Method> method, int precisionBits) {

  boolean isSingle() {
    return precisionBits == Candidate.BINARY32;
  }
}
