package steelyard.harness.bring;

import java.lang.invoke.MethodHandle;
import java.lang.invoke.MethodType;

/** A method of any type that is called with its arguments in an array. */
final class SpreadMethod {
  private final MethodHandle method;
  private final boolean isConstant;

  /**
   * Makes one.
   *
   * @param method the method; its receiver, if any, is bound
   * @param isTimed whether it is the one that this JVM times, and is to be called without a cost
   */
  SpreadMethod(MethodHandle method, boolean isTimed) {
    this.method =
        method
            .asType(method.type().changeReturnType(Object.class))
            .asSpreader(Object[].class, method.type().parameterCount())
            .asType(MethodType.methodType(Object.class, Object[].class));
    isConstant = isTimed && ConstantMethod.set(this.method);
  }

  /** Calls the method; null is the answer of one that returns nothing. */
  Object call(Object[] arguments) {
    try {
      return isConstant ? ConstantMethod.call(arguments) : (Object) method.invokeExact(arguments);
    } catch (RuntimeException | Error thrown) {
      throw thrown;
    } catch (Throwable checked) {
      throw new CheckedException(checked);
    }
  }

  /** What a method threw that is not a runtime exception. */
  private static final class CheckedException extends RuntimeException {
    private static final long serialVersionUID = 1L;

    CheckedException(Throwable thrown) {
      super(thrown.getClass().getSimpleName() + ": " + thrown.getMessage(), thrown);
    }
  }
}
