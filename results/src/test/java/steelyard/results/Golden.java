package steelyard.results;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.TimeZone;

/**
 * Compares texts with the golden files, under several default locales and time zones. After a
 * change of a format, {@code mvn test -DargLine=-Dgolden.write=1} writes the files anew instead,
 * for a reader to compare.
 */
public final class Golden {
  private static final List<String> LOCALES =
      List.of(
          "en-US", "tr-TR", "de-DE", "ar-EG-u-nu-arab", "hi-IN-u-nu-deva", "th-TH-u-ca-buddhist");
  private static final List<String> ZONES =
      List.of("UTC", "Asia/Kathmandu", "America/St_Johns", "Pacific/Apia", "UTC", "Asia/Tokyo");

  private Golden() {}

  /** Makes a text under each locale and compares it with a golden file, byte for byte. */
  public static void check(String name, Text text) {
    Locale locale = Locale.getDefault();
    TimeZone zone = TimeZone.getDefault();
    try {
      for (int i = 0; i < LOCALES.size(); i++) {
        Locale.setDefault(Locale.forLanguageTag(LOCALES.get(i)));
        TimeZone.setDefault(TimeZone.getTimeZone(ZONES.get(i)));
        compare(name, text.make());
      }
    } catch (IOException e) {
      throw new AssertionError(name, e);
    } finally {
      Locale.setDefault(locale);
      TimeZone.setDefault(zone);
    }
  }

  private static void compare(String name, String actual) throws IOException {
    if (System.getProperty("golden.write") != null) {
      Files.writeString(Path.of("src/test/resources/steelyard/results/golden", name), actual);
      return;
    }
    try (InputStream in = Golden.class.getResourceAsStream("golden/" + name)) {
      assertThat(in).as("golden file " + name).isNotNull();
      String expected = new String(in.readAllBytes(), StandardCharsets.UTF_8);
      assertThat(actual).as(name + " under " + Locale.getDefault()).isEqualTo(expected);
    }
  }

  /** Makes a text. */
  @FunctionalInterface
  public interface Text {
    /** Returns the text. */
    String make() throws IOException;
  }
}
