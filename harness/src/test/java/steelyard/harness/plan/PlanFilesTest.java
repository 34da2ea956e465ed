package steelyard.harness.plan;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import steelyard.harness.task.Tasks;

/** Files that stand beside families in a plan. */
final class PlanFilesTest {

  @TempDir private Path folder;
  private final PlanReader reader = new PlanReader(Catalogue.of(Tasks.all()));

  @BeforeEach
  void layOutData() throws IOException {
    write("ledger.csv", "ticket,net_kg\nT1,0.1\nT2,2\nT3,-2\n");
    write("bad.csv", "ticket,net_kg\nT1,NaN\n");
    write("x.txt", "1 2");
    write("y.txt", "3 4");
    Files.createDirectory(folder.resolve("old"));
    write("old/ledger.csv", "net_kg\n5\n");
  }

  @Test
  void filesStandBesideFamilies() throws IOException {
    Plan plan =
        read(
            """
            [timing]
            sizes = [50]
            [[weigh]]
            task = "sum"
            families = ["same-sign"]
            files = ["ledger.csv"]
            columns = ["net_kg"]
            sizes = [20]
            repeats = 2
            candidates = ["exact"]
            time = "file-ledger-net-kg"
            [[weigh]]
            task = "dot"
            files = [["x.txt", "y.txt"], ["y.txt", "x.txt"]]
            candidates = ["exact"]
            """);
    assertThat(plan.problems().stream().map(c -> c.family() + " " + c.size() + " " + c.repeat()))
        .containsExactly(
            "same-sign 20 1",
            "same-sign 20 2",
            "file-ledger-net-kg 3 1",
            "file-x-y 2 1",
            "file-y-x 2 1");
    assertThat(plan.timings().stream().map(c -> c.family() + " " + c.size()))
        .containsExactly("file-ledger-net-kg 3", "file-x-y 2");
    OwnFiles ledger = plan.files("sum").get(0);
    assertThat(ledger.source().files()).containsExactly(folder.resolve("ledger.csv"));
    assertThat(ledger.inexact().count()).isEqualTo(1);
  }

  @Test
  void thePlanAsExecutedReadsBackFromAnywhere() throws IOException {
    Plan plan =
        read(
            """
            [[weigh]]
            task = "sum"
            families = ["same-sign"]
            files = ["ledger.csv"]
            columns = ["2"]
            """);
    assertThat(plan.toToml()).contains("files = [\"" + folder.resolve("ledger.csv"), "[\"2\"]");
    assertThat(reader.read("/elsewhere/plan.toml", plan.toToml())).isEqualTo(plan);

    Plan pair = read("[[weigh]]\ntask = \"dot\"\nfiles = [[\"./x.txt\", \"y.txt\"]]\n");
    assertThat(pair.toToml()).doesNotContain("families", "sizes", "conditions");
    assertThat(reader.read("plan.toml", pair.toToml())).isEqualTo(pair);
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      quoteCharacter = '`',
      value = {
        "files = [\"gone.csv\"] | own.toml:3:10: there is no file ",
        "files = [\"x.txt\", \"bad.csv\"] | own.toml:3:19: ",
        "files = [\"x.txt\", \"bad.csv\"] | bad.csv:2:4: 'NaN' is not finite",
        "files = \"x.txt\" | own.toml:3:1: 'files' must be a list of texts, or of lists of texts",
        "files = [3] | own.toml:3:1: 'files' must be a text in quotes",
        "files = [[]] | own.toml:3:1: 'files' has an empty list in it",
        "files = [] | own.toml:3:1: 'files' is an empty list",
        "files = [\"x.txt\", \"x.txt\"] | own.toml:3:1: 'files' has \"x.txt\" twice",
        "files = [[\"x.txt\", \"y.txt\"]] | own.toml:3:11: task sum takes a vector 'terms', in one",
        "files = [\"ledger.csv\"];columns = [\"nett_kg\"] | own.toml:3:10: ",
        "files = [\"ledger.csv\"];columns = [\"nett_kg\"] | did you mean 'net_kg'?",
        "columns = [\"net_kg\"] | own.toml:3:1: 'columns' says which columns of 'files'",
        "files = [\"x.txt\"];sizes = [5] | own.toml:4:1: 'sizes' is for families",
        "files = [\"x.txt\"];conditions = [5] | own.toml:4:1: 'conditions' is for families",
        "files = [\"x.txt\"];time = \"file-y\" | own.toml:4:8: family 'file-y' does not take part",
        "files = [\"ledger.csv\", \"old/ledger.csv\"];columns = [\"net_kg\"] | would be called 'file-ledger-net-kg'; rename a file",
        "file = [\"x.txt\"] | own.toml:3:1: unknown key 'file'; did you mean 'files'?"
      })
  void everyMistakeIsSaidWithItsPlaceInThePlan(String entry, String sentence) {
    String text = "[[weigh]]\ntask = \"sum\"\n" + entry.replace(";", "\n") + "\n";
    assertThatThrownBy(() -> read(text))
        .isInstanceOf(PlanException.class)
        .hasMessageContaining("own.toml:")
        .hasMessageContaining(sentence)
        .message()
        .hasLineCount(1);
  }

  private Plan read(String text) throws IOException {
    return reader.read(write("own.toml", text));
  }

  private Path write(String name, String text) throws IOException {
    return Files.writeString(folder.resolve(name), text);
  }
}
