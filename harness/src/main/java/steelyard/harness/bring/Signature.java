package steelyard.harness.bring;

import java.lang.reflect.Method;
import java.lang.reflect.Modifier;
import java.util.Arrays;
import java.util.stream.Collectors;
import steelyard.algorithms.Candidate;

/**
 * What a method must look like to be a candidate: as the method of the task's interface, in double
 * or in single precision.
 *
 * @param kernelMethod the method of the task's interface
 */
record Signature(Method kernelMethod) {

  /** Returns that of a task's interface. */
  static Signature of(Class<?> kernelType) {
    return new Signature(
        Arrays.stream(kernelType.getMethods())
            .filter(method -> Modifier.isAbstract(method.getModifiers()))
            .findFirst()
            .orElseThrow());
  }

  /** Says whether the answer is one number. */
  boolean isScalar() {
    return !kernelMethod.getReturnType().isArray();
  }

  boolean isDouble(Method method) {
    return Arrays.equals(method.getParameterTypes(), kernelMethod.getParameterTypes())
        && method.getReturnType() == kernelMethod.getReturnType();
  }

  boolean isSingle(Method method) {
    Class<?>[] types = kernelMethod.getParameterTypes();
    Arrays.setAll(types, i -> single(types[i]));
    return Arrays.equals(method.getParameterTypes(), types)
        && method.getReturnType() == single(kernelMethod.getReturnType());
  }

  boolean fits(Method method) {
    return isDouble(method) || isSingle(method);
  }

  int precisionBits(Method method) {
    return isSingle(method) ? Candidate.BINARY32 : Candidate.BINARY64;
  }

  /** Returns both forms of a method of that name, for messages. */
  String wanted(String name) {
    String inDouble =
        kernelMethod.getReturnType().getSimpleName() + " " + name + parameters(kernelMethod);
    return inDouble + " or " + inDouble.replace("double", "float");
  }

  /** Returns a method as it is declared, for messages. */
  static String text(Method method) {
    String modifiers = Modifier.toString(method.getModifiers() & WORTH_SHOWING);
    return (modifiers.isEmpty() ? "" : modifiers + " ")
        + method.getReturnType().getSimpleName()
        + " "
        + method.getName()
        + parameters(method);
  }

  private static final int WORTH_SHOWING =
      Modifier.PRIVATE | Modifier.PROTECTED | Modifier.STATIC | Modifier.ABSTRACT;

  /** Returns a method's parameter types in parentheses. */
  static String parameters(Method method) {
    return Arrays.stream(method.getParameterTypes())
        .map(Class::getSimpleName)
        .collect(Collectors.joining(", ", "(", ")"));
  }

  private static Class<?> single(Class<?> type) {
    if (type.isArray()) {
      return single(type.getComponentType()).arrayType();
    }
    return type == double.class ? float.class : type;
  }
}
