package steelyard.harness.bring;

import java.lang.invoke.LambdaMetafactory;
import java.lang.invoke.MethodHandle;
import java.lang.invoke.MethodHandles;
import java.lang.invoke.MethodType;
import java.lang.reflect.InvocationTargetException;
import java.lang.reflect.Method;
import java.lang.reflect.Modifier;
import java.util.Optional;
import steelyard.harness.task.Task;

/**
 * Makes a kernel of code that was found. A method in double becomes an object of the task's
 * interface that calls it directly, as a lambda expression would.
 */
final class KernelMaker {
  private KernelMaker() {}

  /**
   * Makes a kernel; this is the first that runs code of the candidate.
   *
   * @param keepsInput whether a float kernel may keep the input of its last call in single
   *     precision for the next, which is for timing
   * @throws BringException if its class cannot be initialized or instantiated
   */
  static <K> K make(Task<K, ?> task, FoundCode code, boolean keepsInput) {
    try {
      // Of the task's interface, as was found out when the code was found.
      @SuppressWarnings("unchecked")
      K kernel = (K) object(task, code, keepsInput);
      return kernel;
    } catch (BringException known) {
      throw known;
    } catch (Throwable thrown) {
      throw failed(code.type(), thrown);
    }
  }

  private static Object object(Task<?, ?> task, FoundCode code, boolean keepsInput)
      throws Throwable {
    if (code.method().isEmpty()) {
      return instance(code.type());
    }
    Method method = code.method().get();
    Optional<Object> receiver =
        Modifier.isStatic(method.getModifiers())
            ? Optional.empty()
            : Optional.of(instance(code.type()));
    MethodHandles.Lookup lookup = MethodHandles.privateLookupIn(code.type(), access(code.type()));
    MethodHandle handle = lookup.unreflect(method);
    return code.isSingle()
        ? task.kernel(
            new SingleAnswers(
                receiver.isPresent() ? handle.bindTo(receiver.get()) : handle, keepsInput))
        : direct(task.kernelType(), lookup, handle, receiver);
  }

  private static MethodHandles.Lookup access(Class<?> type) throws ReflectiveOperationException {
    return type.getClassLoader() instanceof CandidateLoader loader
        ? loader.lookup()
        : MethodHandles.lookup();
  }

  private static Object direct(
      Class<?> kernelType,
      MethodHandles.Lookup lookup,
      MethodHandle handle,
      Optional<Object> receiver)
      throws Throwable {
    Method kernelMethod = Signature.of(kernelType).kernelMethod();
    MethodType type =
        MethodType.methodType(kernelMethod.getReturnType(), kernelMethod.getParameterTypes());
    MethodType captured =
        receiver
            .map(object -> MethodType.methodType(kernelType, object.getClass()))
            .orElse(MethodType.methodType(kernelType));
    MethodHandle factory =
        LambdaMetafactory.metafactory(lookup, kernelMethod.getName(), captured, type, handle, type)
            .getTarget();
    return receiver.isPresent() ? factory.invoke(receiver.get()) : factory.invoke();
  }

  private static Object instance(Class<?> type) throws Throwable {
    try {
      return type.getConstructor().newInstance();
    } catch (InvocationTargetException thrown) {
      throw thrown.getCause();
    }
  }

  private static BringException failed(Class<?> type, Throwable thrown) {
    Throwable cause =
        thrown instanceof ExceptionInInitializerError && thrown.getCause() != null
            ? thrown.getCause()
            : thrown;
    return new BringException(
        "class "
            + type.getName()
            + " cannot be used: "
            + cause.getClass().getSimpleName()
            + (cause.getMessage() == null ? "" : ": " + cause.getMessage()),
        thrown);
  }
}
