package org.wellwright.project.run;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;
import java.time.Instant;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.wellwright.project.file.Json;

class RunHistoryTest {
    @TempDir
    Path folder;

    private RunHistory history() {
        return RunHistory.of(folder.resolve("ion.wellwright"));
    }

    private static Run run(String kind) {
        return new Run(
                Instant.parse("2024-05-01T12:00:00Z"),
                kind,
                "d",
                "0",
                "s",
                List.of("fit", "ion.wellwright"),
                Json.parse("{\"chi\": 1.50}", "test"));
    }

    @Test
    void runsComeBackInOrder() {
        history().add(run("fit"));
        history().add(run("solve"));
        assertThat(history().read().runs()).containsExactly(run("fit"), run("solve"));
        assertThat(history().read().damaged()).isEmpty();
        assertThat(history().file()).hasFileName("ion.runs.jsonl");
    }

    @Test
    void noFileIsAnEmptyHistory() {
        assertThat(history().read().runs()).isEmpty();
    }

    @Test
    void aTornLastLineCostsThatLineAndNothingElse() throws IOException {
        history().add(run("fit"));
        history().add(run("torn"));
        byte[] bytes = Files.readAllBytes(history().file());
        Files.write(history().file(), java.util.Arrays.copyOf(bytes, bytes.length - 20));
        assertThat(history().read().damaged()).containsExactly(2);
        history().add(run("after"));
        assertThat(history().read().runs()).containsExactly(run("fit"), run("after"));
    }

    @Test
    void aChangedDigitIsNoticed() throws IOException {
        history().add(run("fit"));
        Files.writeString(history().file(), Files.readString(history().file()).replace("1.50", "1.51"));
        assertThat(history().read().damaged()).containsExactly(1);
        Files.writeString(history().file(), "not json\n[1]\n{}\n", StandardOpenOption.APPEND);
        assertThat(history().read().damaged()).containsExactly(1, 2, 3, 4);
    }
}
