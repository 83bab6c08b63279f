package org.wellwright.viewer.picture;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.List;
import java.util.logging.Level;
import java.util.logging.Logger;
import org.junit.jupiter.api.Test;
import org.openide.util.Lookup;
import org.wellwright.project.FigureInput;
import org.wellwright.project.FigureProvider;
import org.wellwright.project.FigureRequest;
import org.wellwright.project.FigureSelection;
import org.wellwright.solver.model.ChannelKey;
import org.wellwright.solver.model.LevelKey;
import org.wellwright.viewer.Samples;
import org.wellwright.viewer.plot.Picture;

class FigureControllerTest {
    private static final LevelKey TWO_P = new LevelKey(Samples.SYSTEM, Samples.CURVE, ChannelKey.ofOrbital(1), 0);
    private static final LevelKey THREE_D = new LevelKey(Samples.SYSTEM, Samples.CURVE, ChannelKey.ofOrbital(2), 0);
    private final Deque<Runnable> worker = new ArrayDeque<>();
    private final List<FigureViewModel> shown = new ArrayList<>();
    private final FigureInput input = Samples.atom(4, 2);
    private final List<FigureRequest> computed = new ArrayList<>();

    @Test
    void onlyTheNewestOfWaitingRequestsIsComputed() {
        FigureController controller = controller();
        FigureRequest first = request(FigureSelection.NONE);
        FigureRequest second = request(new FigureSelection("point charge", List.of(), 0));
        FigureRequest third = request(new FigureSelection("polarised core", List.of(TWO_P), 0));
        controller.show(first);
        controller.show(second);
        controller.show(third);
        work();
        assertThat(computed).containsExactly(third);
        assertThat(shown).singleElement().satisfies(model -> {
            assertThat(model.problem()).isNull();
            assertThat(model.request()).isSameAs(third);
        });
    }

    @Test
    void whatIsMissingIsShownInsteadOfAPicture() {
        controller()
                .show(request(new FigureSelection(
                        "", List.of(new LevelKey(Samples.SYSTEM, Samples.CURVE, ChannelKey.ofOrbital(1), 40)), 0)));
        work();
        assertThat(shown).singleElement().satisfies(model -> {
            assertThat(model.picture()).isNull();
            assertThat(model.problem().what()).contains("has no level");
        });
    }

    @Test
    void aBrokenFigureIsShownAsAProblem() {
        // The fault is made on purpose; its trace need not fill the log of a build.
        Logger.getLogger(FigureController.class.getName()).setLevel(Level.OFF);
        FigureController controller = new FigureController(
                figure(),
                request -> {
                    throw new IllegalStateException("broken on purpose");
                },
                worker::add,
                Runnable::run,
                shown::add);
        controller.show(request(FigureSelection.NONE));
        work();
        assertThat(shown)
                .singleElement()
                .satisfies(model -> assertThat(model.problem().what()).contains("broken on purpose"));
    }

    @Test
    void aClickSelectsAClickWithMoreAddsAndTakesAway() {
        Picture.Spot twoP = new Picture.Spot("", "point charge", TWO_P);
        Picture.Spot threeD = new Picture.Spot("", "", THREE_D);
        FigureSelection one = FigureController.picked(FigureSelection.NONE, twoP, false);
        assertThat(one).isEqualTo(new FigureSelection("point charge", List.of(TWO_P), 0));
        FigureSelection two = FigureController.picked(one, threeD, true);
        assertThat(two).isEqualTo(new FigureSelection("point charge", List.of(TWO_P, THREE_D), 0));
        assertThat(FigureController.picked(two, threeD, true).levels()).containsExactly(TWO_P);
        assertThat(FigureController.picked(two, threeD, false).levels()).containsExactly(THREE_D);
    }

    @Test
    void mStaysWithinTheLOfTheLevelInFront() {
        FigureSelection before = new FigureSelection("", List.of(THREE_D), -2);
        assertThat(FigureController.picked(before, new Picture.Spot("", "", TWO_P), false)
                        .magnetic())
                .isEqualTo(-1);
        assertThat(FigureController.picked(before, new Picture.Spot("", "x", null), false)
                        .magnetic())
                .isEqualTo(-2);
    }

    private FigureController controller() {
        return new FigureController(
                figure(),
                request -> {
                    computed.add(request);
                    return null;
                },
                worker::add,
                Runnable::run,
                shown::add);
    }

    private void work() {
        while (!worker.isEmpty()) {
            worker.poll().run();
        }
    }

    private FigureRequest request(FigureSelection selection) {
        return Samples.request(input, selection, "", false, 12);
    }

    private static FigureProvider figure() {
        return Lookup.getDefault().lookupAll(FigureProvider.class).stream()
                .filter(figure -> figure.id().equals("radial"))
                .findFirst()
                .orElseThrow();
    }
}
