package steelyard.results;

import java.util.Optional;
import java.util.OptionalDouble;

/** Makes observations for tests: everything that a test does not say has a plausible value. */
public final class ObservationBuilder {
  private String task = "sum";
  private String family = "cancelling";
  private String problem = "";
  private String candidate = "naive";
  private int size = 100;
  private int repeat;
  private int precisionBits = 53;
  private OptionalDouble condition = OptionalDouble.of(1);
  private Status status = Status.OK;
  private OptionalDouble forward = OptionalDouble.of(0x1p-53);
  private OptionalDouble backward = OptionalDouble.of(0x1p-53);
  private Rounding rounding = Rounding.OTHER;
  private Optional<Observation.Claim> claim = Optional.empty();

  /** Sets the place of the observation. */
  public ObservationBuilder at(String newTask, String newFamily, String newCandidate) {
    task = newTask;
    family = newFamily;
    candidate = newCandidate;
    return this;
  }

  /** Sets the candidate. */
  public ObservationBuilder candidate(String newCandidate) {
    candidate = newCandidate;
    return this;
  }

  /** Sets the family. */
  public ObservationBuilder family(String newFamily) {
    family = newFamily;
    return this;
  }

  /** Sets the problem's id, which is otherwise made of the rest. */
  public ObservationBuilder problem(String newProblem) {
    problem = newProblem;
    return this;
  }

  /** Sets n. */
  public ObservationBuilder size(int newSize) {
    size = newSize;
    return this;
  }

  /** Sets the number of the instance. */
  public ObservationBuilder repeat(int newRepeat) {
    repeat = newRepeat;
    return this;
  }

  /** Sets the working precision. */
  public ObservationBuilder precision(int bits) {
    precisionBits = bits;
    return this;
  }

  /** Sets κ. */
  public ObservationBuilder condition(double newCondition) {
    condition = OptionalDouble.of(newCondition);
    return this;
  }

  /** Makes κ unknown. */
  public ObservationBuilder noCondition() {
    condition = OptionalDouble.empty();
    return this;
  }

  /** Sets a status; any but ok takes the errors away. */
  public ObservationBuilder status(Status newStatus) {
    status = newStatus;
    return this;
  }

  /** Sets the forward error. */
  public ObservationBuilder forward(double error) {
    forward = OptionalDouble.of(error);
    return this;
  }

  /** Sets the backward error. */
  public ObservationBuilder backward(double error) {
    backward = OptionalDouble.of(error);
    return this;
  }

  /** Makes the backward error unknown. */
  public ObservationBuilder noBackward() {
    backward = OptionalDouble.empty();
    return this;
  }

  /** Sets how the answer is rounded. */
  public ObservationBuilder rounding(Rounding newRounding) {
    rounding = newRounding;
    return this;
  }

  /** Sets a claimed bound on the forward error. */
  public ObservationBuilder claim(double bound, boolean held) {
    claim = Optional.of(new Observation.Claim("forward_error", bound, held));
    return this;
  }

  /** Makes the observation. */
  public Observation build() {
    boolean ok = status == Status.OK;
    String id = task + "/" + family + "/n" + size + "/r" + repeat;
    return new Observation(
        task,
        family,
        problem.isEmpty() ? id : problem,
        candidate,
        size,
        condition,
        repeat,
        42 + repeat,
        precisionBits,
        condition,
        OptionalDouble.empty(),
        Optional.of(true),
        Optional.of("5f3a"),
        Optional.of("exact"),
        OptionalDouble.of(0),
        status,
        ok ? "" : "invented for a test",
        ok ? backward : OptionalDouble.empty(),
        ok ? forward : OptionalDouble.empty(),
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        ok ? excess() : OptionalDouble.empty(),
        ok ? Optional.of(rounding) : Optional.empty(),
        ok ? claim : Optional.empty(),
        ok ? OptionalDouble.of(0.1) : OptionalDouble.empty(),
        Optional.empty());
  }

  private OptionalDouble excess() {
    if (condition.isEmpty() || forward.isEmpty() || Double.isInfinite(forward.getAsDouble())) {
      return OptionalDouble.empty();
    }
    double u = Math.scalb(1.0, -precisionBits);
    return OptionalDouble.of(forward.getAsDouble() / (Math.max(condition.getAsDouble(), 1) * u));
  }
}
