package steelyard.harness.bring;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.HexFormat;
import java.util.List;
import java.util.stream.Collectors;
import steelyard.harness.plan.Addition;

/** Says to the bit which code a candidate was, for the record of a run. */
public final class Origin {
  private Origin() {}

  /**
   * Returns what was used, and the names of its jars, each with the SHA-256 digest of its bytes.
   */
  public static String of(Addition addition) {
    List<String> jars = addition.jars();
    return jars.isEmpty()
        ? addition.use()
        : addition.use()
            + " in "
            + jars.stream().map(Origin::withDigest).collect(Collectors.joining(", "));
  }

  private static String withDigest(String jar) {
    Path path = Path.of(jar);
    String name = String.valueOf(path.getFileName());
    if (Files.isDirectory(path)) {
      return name;
    }
    try {
      byte[] digest = MessageDigest.getInstance("SHA-256").digest(Files.readAllBytes(path));
      return name + " sha256:" + HexFormat.of().formatHex(digest);
    } catch (IOException gone) {
      return name;
    } catch (NoSuchAlgorithmException impossible) {
      throw new IllegalStateException("every Java platform has SHA-256", impossible);
    }
  }
}
