package steelyard.harness.plan;

import java.util.List;

/**
 * A candidate that a plan brings along.
 *
 * @param task the id of its task
 * @param id its id, unlike that of any other candidate of the task
 * @param use what it is: {@code com.acme.Totals#net}, a method; {@code com.acme.Total}, a class
 *     that implements the task's interface; {@code services}, every such class that the jars
 *     provide; {@code exec: COMMAND}, a program; {@code native: LIBRARY!FUNCTION}
 * @param jars the jars and folders with its classes; no other candidate sees them
 */
public record Addition(String task, String id, String use, List<String> jars) {

  /** Copies the list. */
  public Addition {
    jars = List.copyOf(jars);
  }
}
