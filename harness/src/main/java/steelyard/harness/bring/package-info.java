/**
 * Candidates from outside: their code is found, checked, made a kernel, and run in a JVM of its
 * own. It judges no answer, and what a candidate does to its own JVM stays there.
 */
package steelyard.harness.bring;
