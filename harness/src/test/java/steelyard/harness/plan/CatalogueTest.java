package steelyard.harness.plan;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.function.Function;
import org.apache.commons.rng.UniformRandomProvider;
import org.junit.jupiter.api.Test;
import org.openjdk.jmh.infra.Blackhole;
import steelyard.algorithms.Candidate;
import steelyard.harness.task.PartShape;
import steelyard.harness.task.Task;
import steelyard.problems.Data;
import steelyard.problems.Family;
import steelyard.problems.Problem;
import steelyard.problems.Reach;

class CatalogueTest {

  @Test
  void listsWhatTasksOffer() {
    assertThat(Catalogue.of(List.of(new Loads())))
        .isEqualTo(
            new Catalogue(
                List.of(
                    new Catalogue.TaskEntry(
                        "load",
                        List.of(new Catalogue.FamilyEntry("silo", Reach.upTo(1e5, 2, 9))),
                        List.of("plain", "careful")))));
  }

  private static final class Loads implements Task<Runnable, Data> {
    @Override
    public String id() {
      return "load";
    }

    @Override
    public String description() {
      return "a load";
    }

    @Override
    public Class<?> kernelType() {
      return Runnable.class;
    }

    @Override
    public Runnable kernel(Function<List<Data.Part>, double[]> answers) {
      return () -> {};
    }

    @Override
    public List<Candidate<Runnable>> candidates() {
      return List.of(
          Candidate.of("plain", () -> {}, "", "", ""),
          Candidate.of("careful", () -> {}, "", "", ""));
    }

    @Override
    public List<Family<Data>> families() {
      return List.of(new Silo());
    }

    @Override
    public List<PartShape> shapes() {
      return List.of();
    }

    @Override
    public Problem<Data> problem(Data data) {
      throw new UnsupportedOperationException("a catalogue makes no problem");
    }

    @Override
    public Data data(List<Data.Part> parts) {
      return () -> parts;
    }

    @Override
    public double[] apply(Runnable kernel, Data data) {
      return new double[1];
    }

    @Override
    public void time(Runnable kernel, Data data, Blackhole sink) {
      sink.consume(data);
    }
  }

  private static final class Silo implements Family<Data> {
    @Override
    public Profile profile() {
      return new Profile("silo", "", "", "");
    }

    @Override
    public Reach reach() {
      return Reach.upTo(1e5, 2, 9);
    }

    @Override
    public Problem<Data> generate(Request request, UniformRandomProvider random) {
      throw new UnsupportedOperationException("a catalogue makes no problem");
    }
  }
}
