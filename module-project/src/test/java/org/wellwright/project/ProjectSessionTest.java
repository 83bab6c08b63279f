package org.wellwright.project;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.TimeUnit;
import org.junit.jupiter.api.Test;

class ProjectSessionTest {
    private final ProjectSession session =
            new ProjectSession(Project.of("start", Documents.hydrogen("1")), Path.of("p.wellwright"));

    private boolean rename(String title) {
        return session.edit("Rename", project -> project.withTitle(title));
    }

    @Test
    void editsAreUndoneAndDoneAgainInOrder() {
        rename("one");
        rename("two");
        assertThat(session.undoLabel()).contains("Rename");
        assertThat(session.undo()).isTrue();
        assertThat(session.project().title()).isEqualTo("one");
        assertThat(session.undo()).isTrue();
        assertThat(session.undo()).isFalse();
        assertThat(session.project().title()).isEqualTo("start");
        assertThat(session.redo()).isTrue();
        assertThat(session.redo()).isTrue();
        assertThat(session.redo()).isFalse();
        assertThat(session.project().title()).isEqualTo("two");
    }

    @Test
    void anEditAfterUndoForgetsWhatCouldBeRedone() {
        rename("one");
        session.undo();
        rename("other");
        assertThat(session.redoLabel()).isEmpty();
    }

    @Test
    void oneGestureIsOneStep() {
        for (int i = 0; i < 50; i++) {
            String title = "drag " + i;
            session.edit("Drag", "slider a", project -> project.withTitle(title));
        }
        session.edit("Drag", "slider b", project -> project.withTitle("other slider"));
        session.undo();
        assertThat(session.project().title()).isEqualTo("drag 49");
        session.undo();
        assertThat(session.project().title()).isEqualTo("start");
    }

    @Test
    void anEndedGestureIsNotContinued() {
        session.edit("Type", "field", project -> project.withTitle("a"));
        session.endGesture();
        session.edit("Type", "field", project -> project.withTitle("ab"));
        session.undo();
        assertThat(session.project().title()).isEqualTo("a");
    }

    @Test
    void anEditThatChangesNothingIsNoStep() {
        assertThat(rename("start")).isFalse();
        assertThat(session.undoLabel()).isEmpty();
        assertThat(session.modified()).isFalse();
    }

    @Test
    void unsavedMarkFollowsContentNotSteps() {
        rename("one");
        assertThat(session.modified()).isTrue();
        session.undo();
        assertThat(session.modified()).isFalse();
        rename("one");
        session.markSaved(session.project(), Path.of("q.wellwright"));
        assertThat(session.modified()).isFalse();
        session.undo();
        assertThat(session.modified()).isTrue();
        assertThat(session.file()).contains(Path.of("q.wellwright"));
    }

    @Test
    void viewStatesAreNoEditAndSurviveUndo() {
        rename("one");
        session.putViews(Map.of("v", Map.of("zoom", "2")));
        assertThat(session.undoLabel()).contains("Rename");
        session.undo();
        assertThat(session.project().views()).containsKey("v");
        assertThat(session.modified()).isFalse();
    }

    @Test
    void aLateResultIsAppliedOnlyToTheDocumentItBelongsTo() {
        String digest = session.project().digest();
        rename("only the title");
        assertThat(session.editIf(digest, "Fit", project -> project.withDocument(Documents.hydrogen("2"))))
                .isTrue();
        assertThat(session.editIf(digest, "Fit", project -> project.withDocument(Documents.hydrogen("3"))))
                .isFalse();
        assertThat(session.project().document()).isEqualTo(Documents.hydrogen("2"));
    }

    @Test
    void editsOfManyThreadsAllArrive() throws InterruptedException {
        ExecutorService workers = Executors.newFixedThreadPool(4);
        List<Runnable> jobs = new ArrayList<>();
        for (int i = 0; i < 200; i++) {
            jobs.add(() -> session.edit("Append", project -> project.withNotes(project.notes() + "x")));
        }
        jobs.forEach(workers::execute);
        workers.shutdown();
        assertThat(workers.awaitTermination(1, TimeUnit.MINUTES)).isTrue();
        assertThat(session.project().notes()).hasSize(200);
        int undone = 0;
        while (session.undo()) {
            undone++;
        }
        assertThat(undone).isEqualTo(200);
    }

    @Test
    void listenersHearEveryChange() {
        List<String> heard = new ArrayList<>();
        session.addListener(() -> heard.add(session.project().title()));
        rename("one");
        session.undo();
        session.redo();
        assertThat(heard).containsExactly("one", "start", "one");
    }

    @Test
    void theOldestStepsAreDropped() {
        for (int i = 0; i < 3 * ProjectSession.DEPTH; i++) {
            rename("title " + i);
        }
        int undone = 0;
        while (session.undo()) {
            undone++;
        }
        assertThat(undone).isBetween(ProjectSession.DEPTH, 2 * ProjectSession.DEPTH);
    }
}
