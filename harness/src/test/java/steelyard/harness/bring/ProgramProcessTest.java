package steelyard.harness.bring;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.catchThrowableOfType;
import static org.junit.jupiter.api.Assumptions.assumeTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Random;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.atomic.AtomicReference;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import steelyard.algorithms.sum.Summations;
import steelyard.harness.run.Mishap;
import steelyard.problems.Data;
import steelyard.problems.exact.ExactAccumulator;
import steelyard.results.Status;

/** Programs over pipes, the good ones that ship and bad ones written here for sh. */
class ProgramProcessTest {
  private static final Path EXAMPLES = Path.of("examples", "program");

  @TempDir private Path folder;
  private ServantPool pool;

  @BeforeAll
  static void requireShell() {
    assumeTrue(Files.isExecutable(Path.of("/bin/sh")));
  }

  @AfterEach
  void end() {
    if (pool != null) {
      pool.close();
    }
  }

  @Test
  void theExampleInCGivesTheBitsOfRecursiveSummation() throws Exception {
    assumeTrue(runs("cc", "--version"));
    Path program = folder.resolve("total");
    assertThat(runs("cc", "-O2", "-o", program.toString(), EXAMPLES.resolve("total.c").toString()))
        .isTrue();
    pool = pool(program.toString());
    Random random = new Random(3);
    for (int n = 0; n < 40; n++) {
      double[] terms =
          random.doubles(n, -1, 1).map(x -> Math.scalb(x, random.nextInt(2000) - 1050)).toArray();
      double expected = Summations.all().get(0).kernel().sum(terms);
      assertThat(pool.apply(terms(terms))).containsExactly(expected);
    }
  }

  @Test
  void theExampleInPythonGivesTheNearestDouble() throws Exception {
    assumeTrue(runs("python3", "--version"));
    pool = pool("python3", EXAMPLES.resolve("total.py").toString());
    Random random = new Random(4);
    for (int n = 1; n < 40; n++) {
      double[] terms =
          random.doubles(n, -1, 1).map(x -> Math.scalb(x, random.nextInt(200))).toArray();
      assertThat(pool.apply(terms(terms)))
          .containsExactly(ExactAccumulator.sum(terms).doubleValue());
    }
    assertMishap(Status.EXCEPTION, "intermediate overflow in fsum", 1e308, 1e308);
    assertThat(pool.apply(terms(1, 2))).containsExactly(3);
  }

  // Each says this after the greeting, when it was given the first problem.
  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "echo answer 1 1; echo 0x1.8p+1 | 3.0",
        "echo answer 1 1; echo -INF | -Infinity",
        "echo answer 1 1; echo '-nan(0x8)' | NaN",
        "printf 'answer 1 1\\r\\n 2.5 \\r\\n' | 2.5",
        "echo noise >&2; echo answer 1 1; echo; echo 1e-3 | 0.001",
      })
  void numbersAreReadAsCAndPythonWriteThem(String commands, double answer) throws IOException {
    pool = pool(script("echo steelyard 1; " + commands + "; sleep 20"));
    assertThat(pool.apply(terms(1))).containsExactly(answer);
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "MALFORMED | echo hello | the program does not keep to the protocol: it says 'hello', not"
            + " 'steelyard 1'",
        "MALFORMED | echo steelyard 1; echo 3.5 | the program does not keep to the protocol: it says"
            + " '3.5', not 'answer' and two numbers",
        "MALFORMED | echo steelyard 1; echo answer 7 1 | the program does not keep to the protocol:"
            + " it answers another problem than the one that it was given",
        "MALFORMED | echo steelyard 1; echo answer 1 1; echo 1 2 | the program does not keep to the"
            + " protocol: more numbers than the 1 it announced",
        "MALFORMED | echo steelyard 1; echo answer 1 1; echo 1,5 | the program does not keep to the"
            + " protocol: '1,5' is no number",
        "MALFORMED | echo steelyard 1; echo answer 1 999999999 | the program does not keep to the"
            + " protocol: an answer of 999999999 numbers is too long",
        "MALFORMED | yes | the program does not keep to the protocol: it says 'y', not 'steelyard 1'",
        "EXCEPTION | echo steelyard 1; echo error 1 no wheat; sleep 9 | no wheat",
        "CRASHED | exit 3 | the program ended with exit code 3",
        "CRASHED | echo steelyard 1; echo no wheat >&2; exit 4 | the program ended with exit code 4:"
            + " no wheat",
        "CRASHED | echo steelyard 1; kill -9 $$ | the program ended with exit code 137",
        "CRASHED | echo steelyard 1; sleep 9 & exit 5 | the program ended with exit code 5",
      })
  void whatAProgramDoesWrongHasAStatusAndASentence(Status status, String commands, String sentence)
      throws IOException {
    pool = pool(script(commands));
    assertMishap(status, sentence, 1);
  }

  @Test
  void aProgramThatEndedIsStartedAgain() throws IOException {
    pool = pool(script("echo steelyard 1; echo answer 1 1; echo 2"));
    for (int i = 0; i < 5; i++) {
      assertThat(pool.apply(terms(1))).containsExactly(2);
    }
  }

  @ParameterizedTest
  @CsvSource({"sleep 30", "echo steelyard 1; cat >/dev/null", "echo steelyard 1; sleep 30"})
  void aProgramThatSaysNothingIsEndedWhenItsThreadIsInterrupted(String commands) throws Exception {
    pool = pool(script(commands));
    AtomicReference<Throwable> thrown = new AtomicReference<>();
    CountDownLatch left = new CountDownLatch(1);
    double[] large = new Random(5).doubles(200_000).toArray();
    Thread caller =
        new Thread(
            () -> {
              try {
                pool.apply(terms(large));
              } catch (Mishap mishap) {
                thrown.set(mishap);
              }
              left.countDown();
            });
    caller.start();
    TimeUnit.MILLISECONDS.sleep(300);
    caller.interrupt();
    assertThat(left.await(5, TimeUnit.SECONDS)).isTrue();
    assertThat(thrown.get()).isInstanceOf(Mishap.class);
    assertThat(((Mishap) thrown.get()).status()).isEqualTo(Status.TIMEOUT);
    for (ProcessHandle each : started()) {
      each.onExit().get(5, TimeUnit.SECONDS);
    }
  }

  @Test
  void aProgramThatFloodsItsOutputLeavesNoThreadBehind() throws Exception {
    pool = pool(script("echo steelyard 1; yes"));
    for (int i = 0; i < 5; i++) {
      assertMishap(
          Status.MALFORMED,
          "the program does not keep to the protocol: it says 'y', not 'answer' and two numbers",
          1);
    }
    for (Thread each : threadsOfPrograms()) {
      each.join(5000);
      assertThat(each.isAlive()).as(each.getName()).isFalse();
    }
  }

  @Test
  void whatIsWrongIsSaidAlikeOfEveryProblem() throws IOException {
    String script = "n=0; while read line; do [ \"$line\" = end ] || continue; n=$((n+1)); ";
    pool = pool(script("echo steelyard 1; " + script + "echo error $n dry; done"));
    assertMishap(Status.EXCEPTION, "dry", 1);
    assertMishap(Status.EXCEPTION, "dry", 2);
    pool.close();
    pool =
        pool(script("echo steelyard 1; " + script + "echo error $n dry; [ $n = 2 ] && echo; done"));
    assertMishap(Status.EXCEPTION, "dry", 1);
    assertMishap(Status.EXCEPTION, "dry", 2);
    assertMishap(
        Status.MALFORMED,
        "the program does not keep to the protocol: it says '', not 'answer' and two numbers",
        3);
  }

  @Test
  void closingLetsAProgramLeaveByItself() throws IOException {
    Path farewell = folder.resolve("farewell");
    pool =
        pool(script("echo steelyard 1; echo answer 1 1; echo 2; cat >/dev/null; : >" + farewell));
    assertThat(pool.apply(terms(1))).containsExactly(2);
    pool.close();
    assertThat(farewell).exists();
  }

  @Test
  void theLocaleOfTheUserDoesNotReachAProgram() throws IOException {
    pool =
        pool(script("echo steelyard 1; echo answer 1 1; [ \"$LC_ALL\" = C ] && echo 1 || echo 0"));
    assertThat(pool.apply(terms(1))).containsExactly(1);
  }

  private static List<Thread> threadsOfPrograms() {
    return Thread.getAllStackTraces().keySet().stream()
        .filter(each -> each.getName().startsWith("steelyard-program"))
        .toList();
  }

  private List<ProcessHandle> started() {
    return ProcessHandle.current()
        .descendants()
        .filter(each -> each.info().commandLine().orElse("").contains(folder.toString()))
        .toList();
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "exec: | names no program",
        "exec: ./none | there is no program './none' that may be executed",
        "exec: no-such-program-here | on the search path; one in this folder is ./no-such-program-here",
        "exec: sh -c 'x | is not closed",
      })
  void aCommandThatCannotBeStartedIsRefused(String use, String sentence) {
    assertThatThrownBy(() -> ProgramCommand.find(use))
        .isInstanceOf(BringException.class)
        .hasMessageContaining(sentence);
  }

  @Test
  void wordsAreDividedAtBlanksOutsideOfQuotes() {
    assertThat(ProgramCommand.find(" exec:  sh -c 'a b'  \"\" x\"y z\" ").orElseThrow().words())
        .containsExactly("sh", "-c", "a b", "", "xy z");
    assertThat(ProgramCommand.find("com.acme.Totals#net")).isEmpty();
  }

  private void assertMishap(Status status, String sentence, double... terms) {
    Mishap mishap = catchThrowableOfType(Mishap.class, () -> pool.apply(terms(terms)));
    assertThat(mishap).hasMessage(sentence);
    assertThat(mishap.status()).isEqualTo(status);
  }

  private String script(String commands) throws IOException {
    Path script = folder.resolve("program.sh");
    Files.writeString(script, commands + "\n");
    return script.toString();
  }

  private static ServantPool pool(String... words) {
    List<String> command = words.length == 1 ? command(words[0]) : List.of(words);
    return new ServantPool(() -> ProgramProcess.start("sum", command));
  }

  private static List<String> command(String program) {
    return program.endsWith(".sh") ? List.of("/bin/sh", program) : List.of(program);
  }

  private static List<Data.Part> terms(double... terms) {
    return List.of(new Data.Vector("terms", terms));
  }

  private static boolean runs(String... command) throws InterruptedException {
    try {
      return new ProcessBuilder(command)
              .redirectOutput(ProcessBuilder.Redirect.DISCARD)
              .redirectError(ProcessBuilder.Redirect.DISCARD)
              .start()
              .waitFor()
          == 0;
    } catch (IOException none) {
      return false;
    }
  }
}
