package org.wellwright.project.window;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.openide.util.Lookup;
import org.wellwright.project.FigureSelection;
import org.wellwright.project.OpenProjects;
import org.wellwright.project.Project;
import org.wellwright.project.ProjectSession;
import org.wellwright.solver.model.ChannelKey;
import org.wellwright.solver.model.LabelConvention;
import org.wellwright.solver.model.LevelKey;
import org.wellwright.solver.units.UnitSystem;

class SelectionKeptTest {
    private static final FigureSelection PICKED = new FigureSelection(
            "screened",
            List.of(
                    new LevelKey("A-1", "V", ChannelKey.ofSpins(1, 2, 4), 0),
                    new LevelKey("A-2", "upper", new ChannelKey(-1, 2, -1, 1), 3)),
            -1);

    @Test
    void aSelectionReadsBack() {
        assertThat(SelectionKept.selection(SelectionKept.text(PICKED))).isEqualTo(PICKED);
        assertThat(SelectionKept.text(FigureSelection.NONE)).isEmpty();
        assertThat(SelectionKept.selection(Map.of())).isEqualTo(FigureSelection.NONE);
    }

    @Test
    void whatCannotBeReadIsLeftOut() {
        assertThat(SelectionKept.selection(
                        Map.of("model", "m", "level 1", "x", "level 2", "0 -1 -1 0 0\nX\nV", "m", "north")))
                .isEqualTo(new FigureSelection("m", List.of(new LevelKey("X", "V", ChannelKey.ofOrbital(0), 0)), 0));
    }

    @Test
    void aProjectThatIsSelectedAgainHasItsSelection() {
        OpenProjects open = Lookup.getDefault().lookup(OpenProjects.class);
        SelectionKept selections = new SelectionKept();
        Runnable follow = () -> selections.follow(open);
        open.addListener(follow);
        Project project = NewProject.project("a", UnitSystem.ATOMIC, "e-", "p", LabelConvention.ATOMIC);
        ProjectSession one = open.add(project);
        ProjectSession other = open.add(project);
        open.select(one);
        open.select(PICKED);
        open.select(other);
        assertThat(open.getLookup().lookup(FigureSelection.class)).isEqualTo(FigureSelection.NONE);
        open.select(one);
        assertThat(open.getLookup().lookup(FigureSelection.class)).isEqualTo(PICKED);
        assertThat(selections.state(one)).containsEntry("model", "screened");
        open.removeListener(follow);
        open.close(one);
        open.close(other);
        assertThat(open.sessions()).isEmpty();
    }
}
