/**
 * What the project's own work costs, as ratios measured side by side. Nothing here asserts a time,
 * and nothing of it runs with the tests.
 */
package steelyard.harness.benchmark;
