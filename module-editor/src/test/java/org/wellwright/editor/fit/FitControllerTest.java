package org.wellwright.editor.fit;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.List;
import java.util.concurrent.CancellationException;
import org.junit.jupiter.api.Test;
import org.wellwright.editor.TestProjects;
import org.wellwright.editor.edit.ParameterEdits;
import org.wellwright.project.ProjectSession;
import org.wellwright.solver.InvalidModelException;
import org.wellwright.solver.fit.Comparison;
import org.wellwright.solver.fit.Covariance;
import org.wellwright.solver.fit.FitQuality;
import org.wellwright.solver.fit.FitRequest;
import org.wellwright.solver.fit.FitResult;
import org.wellwright.solver.fit.FittedParameter;
import org.wellwright.solver.model.ModelDocument;
import org.wellwright.solver.model.Weighting;
import org.wellwright.solver.radial.SolveMonitor;
import org.wellwright.solver.service.FitService;
import org.wellwright.solver.units.ExactNumber;

class FitControllerTest {
    private final ProjectSession session = TestProjects.session();
    private final Deque<Runnable> work = new ArrayDeque<>();
    private final List<FitViewModel> shown = new ArrayList<>();
    private final FitController controller = new FitController(
            session, new HalvingFit(), work::add, Runnable::run, shown::add, FitController.FitWatcher.NONE);

    /** Halves the depth and reports it with an uncertainty; stops when told to. */
    private static final class HalvingFit implements FitService {
        @Override
        public Comparison compare(ModelDocument document, SolveMonitor monitor) {
            throw new UnsupportedOperationException();
        }

        @Override
        public FitResult fit(FitRequest request, SolveMonitor monitor) {
            if (request.model().equals("none")) {
                throw new InvalidModelException("there is no model 'none'", "", "choose another");
            }
            monitor.progress(0.5, "step 1");
            if (monitor.cancelled()) {
                throw new CancellationException();
            }
            ModelDocument fitted =
                    ParameterEdits.withSetting(request.document(), 1, 0, s -> s.withValue(new ExactNumber("2500")));
            return new FitResult(
                    fitted,
                    request.model(),
                    List.of(new FittedParameter(
                            "depth", "depth", 2500, 12.5, "cm^-1", true, FittedParameter.Bound.NONE)),
                    List.of(),
                    Covariance.of(List.of("depth"), new double[][] {{156.25}}),
                    new FitQuality(1.5, 2, 1, Double.NaN),
                    Weighting.KNOWN,
                    1,
                    List.of(),
                    List.of(),
                    List.of(),
                    4,
                    true,
                    List.of());
        }
    }

    private String depth() {
        return ParameterEdits.setting(session.project().document().parameters().get(1), 0)
                .value()
                .text();
    }

    private void finish() {
        while (!work.isEmpty()) {
            work.remove().run();
        }
    }

    @Test
    void nothingChangesUntilAResultIsAcceptedAndThatIsOneStep() {
        controller.run("screened");
        assertThat(controller.shown().state()).isEqualTo(FitViewModel.State.RUNNING);
        finish();
        assertThat(controller.shown().state()).isEqualTo(FitViewModel.State.DONE);
        assertThat(controller.shown().parameters().get(0).before()).isEqualTo("5000");
        assertThat(controller.shown().parameters().get(0).after()).isEqualTo("2500(12)");
        assertThat(controller.shown().parameters().get(0).change()).isEqualTo("-200.0 σ");
        assertThat(controller.shown().quality()).contains("χ²/ν = 1.5");
        assertThat(depth()).isEqualTo("5000");
        assertThat(controller.accept()).isEmpty();
        assertThat(depth()).isEqualTo("2500");
        assertThat(session.undoLabel()).contains("Accept the fit of screened");
        session.undo();
        assertThat(depth()).isEqualTo("5000");
    }

    @Test
    void aResultOfOtherValuesIsNotAccepted() {
        controller.run("screened");
        session.edit(
                "Change radius",
                project -> project.withDocument(
                        ParameterEdits.withSetting(project.document(), 2, 0, s -> s.withValue(new ExactNumber("2")))));
        finish();
        assertThat(controller.outdated()).isTrue();
        assertThat(controller.accept())
                .hasValueSatisfying(problem -> assertThat(problem.sentence()).contains("changed since"));
        assertThat(depth()).isEqualTo("5000");
        session.undo();
        assertThat(controller.accept()).isEmpty();
        assertThat(depth()).isEqualTo("2500");
    }

    @Test
    void aNoteWrittenMeanwhileDoesNotMatter() {
        controller.run("screened");
        session.edit("Change the notes", project -> project.withNotes("looks good"));
        finish();
        assertThat(controller.accept()).isEmpty();
        assertThat(session.project().notes()).isEqualTo("looks good");
    }

    @Test
    void cancellingChangesNothing() {
        controller.run("screened");
        controller.cancel();
        finish();
        assertThat(controller.shown().state()).isEqualTo(FitViewModel.State.FAILED);
        assertThat(controller.shown().problem().what()).contains("cancelled");
        assertThat(controller.accept()).isPresent();
    }

    @Test
    void aFaultIsShownAndTheNextRunStartsAfresh() {
        controller.run("none");
        finish();
        assertThat(controller.shown().problem().sentence()).contains("no model 'none'");
        controller.run("screened");
        finish();
        assertThat(controller.shown().state()).isEqualTo(FitViewModel.State.DONE);
        controller.discard();
        assertThat(controller.shown().state()).isEqualTo(FitViewModel.State.IDLE);
        assertThat(session.modified()).isFalse();
    }

    @Test
    void oneFitAtATime() {
        controller.run("screened");
        controller.run("soft");
        assertThat(work).hasSize(1);
    }
}
