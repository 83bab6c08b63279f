package org.wellwright.project.window.runs;

import static org.assertj.core.api.Assertions.assertThat;

import java.time.Instant;
import java.time.ZoneOffset;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.wellwright.project.file.Json;
import org.wellwright.project.run.Run;
import org.wellwright.project.run.RunHistory;

class RunsViewModelTest {
    private static Run run(String time, String digest, String result) {
        return new Run(
                Instant.parse(time),
                "fit",
                digest,
                "0.1.0",
                "solver 1",
                List.of("wellwright-batch", "fit", "a.wellwright"),
                Json.parse(result, "test"));
    }

    @Test
    void theLatestRunStandsFirstAndSaysWhetherItsInputIsThatOfNow() {
        RunHistory.Content history = new RunHistory.Content(
                List.of(
                        run(
                                "2026-03-01T12:00:00Z",
                                "0123456789",
                                "{\"model\": \"soft\", \"chiSquare\": 12.5, \"degreesOfFreedom\": 5}"),
                        run(
                                "2026-03-02T12:00:00Z",
                                "abcdefabcd",
                                "{\"model\": \"hard\", \"chiSquare\": 3, \"degreesOfFreedom\": 0}")),
                List.of());
        RunsViewModel model = RunsViewModel.of(history, "0123456789", ZoneOffset.UTC);
        assertThat(model.rows()).extracting(RunsViewModel.Row::model).containsExactly("hard", "soft");
        assertThat(model.rows()).extracting(RunsViewModel.Row::quality).containsExactly("", "2.500");
        assertThat(model.rows()).extracting(RunsViewModel.Row::input).containsExactly("abcdefab", "01234567 (as now)");
        assertThat(model.rows().get(1).time()).isEqualTo("2026-03-01 12:00:00");
        assertThat(model.message()).isEmpty();
    }

    @Test
    void damagedLinesAreCountedAndOtherResultsShowNothingTheyDoNotHave() {
        RunHistory.Content history =
                new RunHistory.Content(List.of(run("2026-03-01T12:00:00Z", "01", "[1, 2]")), List.of(2, 5));
        RunsViewModel model = RunsViewModel.of(history, "", ZoneOffset.UTC);
        assertThat(model.message()).isEqualTo("2 lines of the history are damaged and left out");
        assertThat(model.rows().get(0).model()).isEmpty();
        assertThat(model.rows().get(0).input()).isEqualTo("01");
    }
}
