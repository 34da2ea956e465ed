package steelyard.harness.bring;

import java.lang.invoke.MethodHandle;
import java.lang.invoke.MethodHandles;
import java.lang.invoke.MethodType;
import java.lang.reflect.Array;
import java.lang.reflect.InvocationTargetException;
import java.lang.reflect.Method;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import steelyard.problems.Data;

/**
 * A function in a shared library as a kernel, through the foreign-function interface of JDK 22. The
 * interface is reached by reflection, because the project is compiled for JDK 17. Arrays are passed
 * where they lie, without a copy; matrices are laid out row by row first.
 *
 * @see <a href="https://openjdk.org/jeps/454">JEP 454: Foreign Function and Memory API</a>
 */
final class NativeAnswers implements Function<List<Data.Part>, double[]> {
  private final SpreadMethod function;
  private final boolean isScalar;
  private final boolean isLong;

  /**
   * Finds a function.
   *
   * @param signature of the task's interface
   * @param isTimed whether it is the one that this JVM times
   * @throws BringException if the library cannot be loaded, or has no such function
   */
  NativeAnswers(NativeFunction wanted, Signature signature, boolean isTimed) {
    isScalar = signature.isScalar();
    isLong = wanted.isLong();
    int arrays = signature.kernelMethod().getParameterCount() + (isScalar ? 0 : 1);
    try {
      function = new SpreadMethod(downcall(wanted, arrays, isScalar), isTimed);
    } catch (InvocationTargetException thrown) {
      throw failed(wanted, thrown.getCause());
    } catch (ReflectiveOperationException impossible) {
      throw failed(wanted, impossible);
    }
  }

  private static BringException failed(NativeFunction wanted, Throwable cause) {
    return new BringException(
        "function "
            + wanted.name()
            + " of "
            + wanted.library().getFileName()
            + " cannot be used: "
            + cause.getMessage(),
        cause);
  }

  // The downcall takes the arrays themselves, and is critical: it lets C see them where they lie.
  private static MethodHandle downcall(NativeFunction wanted, int parameters, boolean isScalar)
      throws ReflectiveOperationException {
    Class<?> linkerType = Class.forName("java.lang.foreign.Linker");
    Class<?> optionType = Class.forName("java.lang.foreign.Linker$Option");
    Class<?> segmentType = Class.forName("java.lang.foreign.MemorySegment");
    Class<?> layoutType = Class.forName("java.lang.foreign.MemoryLayout");
    Class<?> valueType = Class.forName("java.lang.foreign.ValueLayout");
    Class<?> descriptorType = Class.forName("java.lang.foreign.FunctionDescriptor");
    Class<?> arenaType = Class.forName("java.lang.foreign.Arena");
    Class<?> lookupType = Class.forName("java.lang.foreign.SymbolLookup");
    Object arena = arenaType.getMethod("global").invoke(null);
    Object lookup =
        lookupType
            .getMethod("libraryLookup", Path.class, arenaType)
            .invoke(null, wanted.library(), arena);
    Object symbol =
        ((Optional<?>) lookupType.getMethod("find", String.class).invoke(lookup, wanted.name()))
            .orElseThrow(
                () ->
                    new BringException(
                        "the library "
                            + wanted.library().getFileName()
                            + " has no function "
                            + wanted.name()));
    Object layouts = Array.newInstance(layoutType, parameters + 1);
    for (int i = 0; i < parameters; i++) {
      Array.set(layouts, i, valueType.getField("ADDRESS").get(null));
    }
    String count = wanted.isLong() ? "JAVA_LONG" : "JAVA_INT";
    Array.set(layouts, parameters, valueType.getField(count).get(null));
    Object descriptor =
        isScalar
            ? descriptorType
                .getMethod("of", layoutType, layouts.getClass())
                .invoke(null, valueType.getField("JAVA_DOUBLE").get(null), layouts)
            : descriptorType.getMethod("ofVoid", layouts.getClass()).invoke(null, layouts);
    Object options = Array.newInstance(optionType, 1);
    Array.set(options, 0, optionType.getMethod("critical", boolean.class).invoke(null, true));
    Method downcall =
        linkerType.getMethod("downcallHandle", segmentType, descriptorType, options.getClass());
    Object linker = linkerType.getMethod("nativeLinker").invoke(null);
    MethodHandle handle = (MethodHandle) downcall.invoke(linker, symbol, descriptor, options);
    MethodHandle ofArray =
        MethodHandles.publicLookup()
            .findStatic(segmentType, "ofArray", MethodType.methodType(segmentType, double[].class));
    for (int i = 0; i < parameters; i++) {
      handle = MethodHandles.filterArguments(handle, i, ofArray);
    }
    return handle;
  }

  @Override
  public double[] apply(List<Data.Part> parts) {
    List<Object> arguments = new ArrayList<>();
    for (Data.Part part : parts) {
      arguments.add(
          part instanceof Data.Matrix matrix
              ? byRows(matrix.rows())
              : ((Data.Vector) part).values());
    }
    int n = count(parts);
    double[] answer = new double[isScalar ? 1 : n];
    if (!isScalar) {
      // What the function leaves out must not look like an answer.
      Arrays.fill(answer, Double.NaN);
      arguments.add(answer);
    }
    if (isLong) {
      arguments.add((long) n);
    } else {
      arguments.add(n);
    }
    Object result = function.call(arguments.toArray());
    if (isScalar) {
      answer[0] = (double) result;
    }
    writeBack(parts, arguments);
    return answer;
  }

  private static int count(List<Data.Part> parts) {
    return parts.get(0) instanceof Data.Matrix matrix
        ? matrix.rows().length
        : ((Data.Vector) parts.get(0)).values().length;
  }

  private static double[] byRows(double[][] rows) {
    int columns = rows.length == 0 ? 0 : rows[0].length;
    double[] all = new double[rows.length * columns];
    for (int i = 0; i < rows.length; i++) {
      System.arraycopy(rows[i], 0, all, i * columns, columns);
    }
    return all;
  }

  // A matrix that C wrote to must differ afterwards, as a vector does by itself.
  private static void writeBack(List<Data.Part> parts, List<Object> arguments) {
    for (int part = 0; part < parts.size(); part++) {
      if (parts.get(part) instanceof Data.Matrix matrix) {
        double[] all = (double[]) arguments.get(part);
        for (int i = 0; i < matrix.rows().length; i++) {
          double[] row = matrix.rows()[i];
          System.arraycopy(all, i * row.length, row, 0, row.length);
        }
      }
    }
  }
}
