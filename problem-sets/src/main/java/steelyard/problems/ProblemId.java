package steelyard.problems;

import java.nio.ByteBuffer;
import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.OptionalDouble;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.apache.commons.rng.UniformRandomProvider;
import org.apache.commons.rng.simple.RandomSource;

/**
 * The name of a problem, from which the same instance can be made again.
 *
 * <p>Its text is {@code task/family/k<condition>/n<size>/r<repeat>/s<seed>}, for example {@code
 * sum/cancelling/k1e12/n1000/r3}. A family without a knob has no {@code k} segment, and the default
 * seed is not written. Every problem has exactly one text.
 *
 * @param task the task's id
 * @param family the family's id
 * @param condition the target condition number, at least 1; empty for a family without a knob. It
 *     is rounded to six significant digits, so that the text holds all of it
 * @param size n, at least 1
 * @param repeat which of several instances of the same kind, at least 0
 * @param seed the seed of the whole run
 */
public record ProblemId(
    String task, String family, OptionalDouble condition, int size, int repeat, long seed) {

  /** The seed that the text leaves out. */
  public static final long DEFAULT_SEED = 1;

  private static final Pattern NAME = Pattern.compile("[a-z0-9]+(-[a-z0-9]+)*");
  private static final Pattern TEXT =
      Pattern.compile(
          "([^/]+)/([^/]+)(?:/k([1-9](?:\\.[0-9]{1,5})?(?:e[0-9]{1,3})?))?"
              + "/n([0-9]{1,9})/r([0-9]{1,9})(?:/s(-?[0-9]{1,19}))?");

  /**
   * Checks the parts.
   *
   * @throws IllegalArgumentException if a name is not lower case letters, digits and hyphens, or a
   *     number lies outside its range
   */
  public ProblemId {
    requireName("task", task);
    requireName("family", family);
    if (condition.isPresent()) {
      double wanted = condition.getAsDouble();
      if (!(wanted >= 1 && wanted <= Double.MAX_VALUE)) {
        throw new IllegalArgumentException(
            "the target condition number must be finite and at least 1, but it is "
                + ConditionText.of(wanted));
      }
      condition = OptionalDouble.of(ConditionText.canonical(wanted));
    }
    if (size < 1) {
      throw new IllegalArgumentException("the size must be at least 1, but it is " + size);
    }
    if (repeat < 0) {
      throw new IllegalArgumentException("the repeat must be at least 0, but it is " + repeat);
    }
  }

  /** Says whether a text can be the id of a task, a family or a candidate. */
  public static boolean isName(String text) {
    return NAME.matcher(text).matches();
  }

  private static void requireName(String what, String name) {
    if (!isName(name)) {
      throw new IllegalArgumentException(
          "the "
              + what
              + " of a problem must be lower case letters, digits and hyphens, but it is '"
              + name
              + "'");
    }
  }

  /**
   * Returns the id that a text stands for.
   *
   * @param text the text, exactly as {@link #toString} writes it
   * @return the id
   * @throws IllegalArgumentException if the text is not one that {@link #toString} writes
   */
  public static ProblemId parse(String text) {
    Matcher matcher = TEXT.matcher(text);
    if (!matcher.matches()) {
      throw new IllegalArgumentException(
          "problem id '" + text + "' must look like sum/cancelling/k1e12/n1000/r3");
    }
    String condition = matcher.group(3);
    ProblemId id =
        new ProblemId(
            matcher.group(1),
            matcher.group(2),
            condition == null
                ? OptionalDouble.empty()
                : OptionalDouble.of(Double.parseDouble(condition)),
            Integer.parseInt(matcher.group(4)),
            Integer.parseInt(matcher.group(5)),
            parseSeed(text, matcher.group(6)));
    if (!id.toString().equals(text)) {
      throw new IllegalArgumentException("problem id '" + text + "' must be written '" + id + "'");
    }
    return id;
  }

  private static long parseSeed(String text, String seed) {
    try {
      return seed == null ? DEFAULT_SEED : Long.parseLong(seed);
    } catch (NumberFormatException tooLarge) {
      throw new IllegalArgumentException(
          "the seed in problem id '" + text + "' must fit a 64-bit integer", tooLarge);
    }
  }

  /** Returns what to ask of the family; the target condition number is 1 where there is no knob. */
  public Family.Request request() {
    return new Family.Request(condition.orElse(1), size);
  }

  /**
   * Returns the source of this problem's randomness, at its start.
   *
   * <p>It depends on the text and on nothing else: its state is the first 128 bits of the SHA-256
   * digest of the text (with the seed always written). So a problem is the same whether it is made
   * alone or among others, in any order and on any number of threads; and problems that differ in
   * one segment share no stretch of randomness, which consecutive seeds of one generator would not
   * promise.
   */
  public UniformRandomProvider randomness() {
    ByteBuffer digest =
        ByteBuffer.wrap(sha256().digest(textWithSeed().getBytes(StandardCharsets.UTF_8)));
    return RandomSource.XO_RO_SHI_RO_128_PP.create(new long[] {digest.getLong(), digest.getLong()});
  }

  private static MessageDigest sha256() {
    try {
      return MessageDigest.getInstance("SHA-256");
    } catch (NoSuchAlgorithmException impossible) {
      throw new IllegalStateException("every Java platform has SHA-256", impossible);
    }
  }

  private String textWithSeed() {
    StringBuilder text = new StringBuilder(task).append('/').append(family);
    if (condition.isPresent()) {
      text.append("/k").append(ConditionText.of(condition.getAsDouble()));
    }
    return text.append("/n")
        .append(size)
        .append("/r")
        .append(repeat)
        .append("/s")
        .append(seed)
        .toString();
  }

  /** Returns the text. */
  @Override
  public String toString() {
    String text = textWithSeed();
    return seed == DEFAULT_SEED ? text.substring(0, text.lastIndexOf('/')) : text;
  }
}
