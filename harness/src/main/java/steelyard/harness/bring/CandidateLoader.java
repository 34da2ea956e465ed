package steelyard.harness.bring;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.lang.invoke.MethodHandles;
import java.net.URL;
import java.net.URLClassLoader;
import java.util.function.Supplier;

/** The loader of one candidate's classes, which sees those of the harness as well. */
final class CandidateLoader extends URLClassLoader {

  CandidateLoader(URL[] urls) {
    super(urls, CandidateLoader.class.getClassLoader());
  }

  /** Returns access to the classes of this loader. */
  MethodHandles.Lookup lookup() throws ReflectiveOperationException {
    Object anchor = anchorType().getConstructor().newInstance();
    return (MethodHandles.Lookup) ((Supplier<?>) anchor).get();
  }

  private synchronized Class<?> anchorType() {
    Class<?> defined = findLoadedClass(Anchor.class.getName());
    if (defined != null) {
      return defined;
    }
    try (InputStream in = Anchor.class.getResourceAsStream("Anchor.class")) {
      byte[] bytes = in.readAllBytes();
      return defineClass(Anchor.class.getName(), bytes, 0, bytes.length);
    } catch (IOException unreadable) {
      throw new UncheckedIOException(unreadable);
    }
  }
}
