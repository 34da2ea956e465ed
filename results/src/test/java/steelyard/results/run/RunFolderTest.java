package steelyard.results.run;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.TreeMap;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import steelyard.results.SampleRun;
import steelyard.results.run.RunFolder.Existing;
import steelyard.results.table.TableException;

class RunFolderTest {
  @TempDir Path folder;

  @Test
  void aRunComesBack() throws IOException {
    Path first = folder.resolve("deep/first");
    Path second = folder.resolve("second");
    RunFolder.write(first, SampleRun.run(), Existing.KEEP);
    Run read = RunFolder.read(first);
    assertThat(read.provenance()).isEqualTo(SampleRun.provenance());
    assertThat(read.plan()).isEqualTo(SampleRun.run().plan());
    RunFolder.write(second, read, Existing.KEEP);
    for (String name : names(first)) {
      assertThat(second.resolve(name)).hasSameBinaryContentAs(first.resolve(name));
    }
  }

  @Test
  void verdictsThatAreComputedAnewFromAFileAreTheSame() {
    RunFolder.write(folder, SampleRun.run(), Existing.KEEP);
    Run read = RunFolder.read(folder);
    Run anew = Run.of(read.observations(), read.timings(), read.plan(), read.provenance());
    assertThat(anew.verdicts())
        .extracting(v -> v.grade())
        .isEqualTo(read.verdicts().stream().map(v -> v.grade()).toList());
  }

  @Test
  void anIncompleteRunIsReadable() {
    Provenance p = SampleRun.provenance();
    Provenance incomplete =
        new Provenance(
            p.toolVersion(),
            p.plan(),
            p.seed(),
            p.started(),
            Optional.empty(),
            false,
            p.jvm(),
            p.machine(),
            new TreeMap<>(),
            new TreeMap<>());
    RunFolder.write(folder, Run.of(List.of(), List.of(), "", incomplete), Existing.KEEP);
    assertThat(RunFolder.read(folder).provenance()).isEqualTo(incomplete);
  }

  @Test
  void aRunIsReplacedOnlyIfAsked() throws IOException {
    RunFolder.write(folder, SampleRun.run(), Existing.KEEP);
    Files.writeString(folder.resolve("notes.txt"), "mine");
    Run other = Run.of(List.of(), List.of(), "name = \"other\"\n", SampleRun.provenance());
    assertThatThrownBy(() -> RunFolder.write(folder, other, Existing.KEEP))
        .isInstanceOf(RunException.class)
        .hasMessage(
            folder + ": a run is already there; name another folder, or ask to replace it.");
    assertThat(RunFolder.read(folder).observations()).isNotEmpty();
    RunFolder.write(folder, other, Existing.REPLACE);
    assertThat(RunFolder.read(folder).observations()).isEmpty();
    assertThat(folder.resolve("notes.txt")).hasContent("mine");
  }

  @Test
  void whatIsNotARunIsNeverReplaced() throws IOException {
    Files.writeString(folder.resolve("errors.csv"), "mine");
    assertThatThrownBy(() -> RunFolder.write(folder, SampleRun.run(), Existing.REPLACE))
        .isInstanceOf(RunException.class)
        .hasMessageContaining("files that are not a run are there");
    Files.writeString(folder.resolve("run.json"), "{\"tool\": \"another\"}");
    assertThatThrownBy(() -> RunFolder.write(folder, SampleRun.run(), Existing.REPLACE))
        .isInstanceOf(RunException.class);
    assertThat(folder.resolve("errors.csv")).hasContent("mine");
    assertThat(names(folder)).containsExactlyInAnyOrder("errors.csv", "run.json");
  }

  @Test
  void whatAKilledFirstWriteLeftBehindIsInNobodysWay() throws IOException {
    Files.writeString(folder.resolve("errors.csv" + FileSet.ASIDE), "half a fi");
    RunFolder.write(folder, SampleRun.run(), Existing.KEEP);
    assertThat(names(folder)).hasSize(7).noneMatch(name -> name.endsWith(FileSet.ASIDE));
  }

  @Test
  void aFolderThatCannotBeMade() throws IOException {
    Path file = Files.writeString(folder.resolve("file"), "mine");
    assertThatThrownBy(() -> RunFolder.write(file, SampleRun.run(), Existing.REPLACE))
        .isInstanceOf(RunException.class)
        .hasMessage(file + ": this is a file; name a folder for the run.");
    assertThatThrownBy(() -> RunFolder.write(file.resolve("run"), SampleRun.run(), Existing.KEEP))
        .isInstanceOf(RunException.class)
        .hasMessageContaining("the run cannot be written (");
    assertThat(file).hasContent("mine");
  }

  @Test
  void aFileThatCannotBeReplacedLeavesNothingAside() throws IOException {
    RunFolder.write(folder, SampleRun.run(), Existing.KEEP);
    Files.delete(folder.resolve("plan.toml"));
    Files.createDirectories(folder.resolve("plan.toml/full"));
    assertThatThrownBy(() -> RunFolder.write(folder, SampleRun.run(), Existing.REPLACE))
        .isInstanceOf(RunException.class);
    assertThat(names(folder)).noneMatch(name -> name.endsWith(FileSet.ASIDE));
  }

  @Test
  void aFolderThatIsNoRun() throws IOException {
    assertThatThrownBy(() -> RunFolder.read(folder))
        .isInstanceOf(RunException.class)
        .hasMessage(
            folder + ": this is not a run, it has no run.json of ours; name the folder of a run.");
    Files.writeString(folder.resolve("run.json"), "not JSON");
    assertThatThrownBy(() -> RunFolder.read(folder)).isInstanceOf(RunException.class);
    assertThatThrownBy(() -> RunFolder.read(folder.resolve("nowhere")))
        .isInstanceOf(RunException.class);
  }

  @Test
  void aDamagedRecord() throws IOException {
    RunFolder.write(folder, SampleRun.run(), Existing.KEEP);
    Path record = folder.resolve("run.json");
    String good = Files.readString(record);
    Files.writeString(record, good.replace("2026-03-01T22:15:30Z", "yesterday"));
    assertThatThrownBy(() -> RunFolder.read(folder))
        .isInstanceOf(RunException.class)
        .hasMessageContaining("yesterday");
    Files.writeString(record, good.replace("\"cpu\"", "\"gpu\""));
    assertThatThrownBy(() -> RunFolder.read(folder))
        .isInstanceOf(RunException.class)
        .hasMessageContaining("cpu");
    Files.writeString(record, good.replace("\"schema_version\" : 1", "\"schema_version\" : 99"));
    assertThatThrownBy(() -> RunFolder.read(folder))
        .isInstanceOf(RunException.class)
        .hasMessageContaining("the run has version 99 of the tables");
  }

  @Test
  void aMissingTable() throws IOException {
    RunFolder.write(folder, SampleRun.run(), Existing.KEEP);
    Files.delete(folder.resolve("verdicts.csv"));
    assertThatThrownBy(() -> RunFolder.read(folder))
        .isInstanceOf(TableException.class)
        .hasMessageContaining("verdicts.csv: the file is missing");
  }

  private static List<String> names(Path folder) throws IOException {
    try (Stream<Path> files = Files.list(folder)) {
      return files.map(file -> file.getFileName().toString()).sorted().toList();
    }
  }
}
