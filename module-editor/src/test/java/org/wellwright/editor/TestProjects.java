package org.wellwright.editor;

import java.util.List;
import java.util.Map;
import org.wellwright.project.Project;
import org.wellwright.project.ProjectSession;
import org.wellwright.solver.model.ChannelKey;
import org.wellwright.solver.model.Curve;
import org.wellwright.solver.model.DataGroup;
import org.wellwright.solver.model.Datum;
import org.wellwright.solver.model.LabelConvention;
import org.wellwright.solver.model.LevelKey;
import org.wellwright.solver.model.Model;
import org.wellwright.solver.model.ModelDocument;
import org.wellwright.solver.model.Parameter;
import org.wellwright.solver.model.Setting;
import org.wellwright.solver.model.Transform;
import org.wellwright.solver.model.Weighting;
import org.wellwright.solver.pair.PairSystem;
import org.wellwright.solver.pair.ParticleCatalogue;
import org.wellwright.solver.potential.Argument;
import org.wellwright.solver.potential.FamilyTerm;
import org.wellwright.solver.potential.FormulaTerm;
import org.wellwright.solver.potential.TermFrame;
import org.wellwright.solver.units.Constants;
import org.wellwright.solver.units.ExactNumber;

/**
 * A small project for the editor's tests: one pair, two models that share a parameter, two lines. All numbers are
 * invented.
 */
public final class TestProjects {
    private TestProjects() {}

    /** cm⁻¹ and ångström; the models "screened" (a family and a formula) and "soft" (a formula). */
    public static ModelDocument document() {
        List<Parameter> parameters = List.of(
                Parameter.scalar("k", "eV nm", Setting.fixed(new ExactNumber("1.440"))),
                Parameter.scalar("depth", "cm^-1", Setting.free(new ExactNumber("5000"))),
                Parameter.scalar(
                        "radius",
                        "angstrom",
                        new Setting(new ExactNumber("1.5"), true, new ExactNumber("0.5"), new ExactNumber("4"), null)));
        Model screened = Model.of(
                "screened",
                List.of(Curve.of(
                        "V",
                        List.of(
                                new FamilyTerm(
                                        TermFrame.named("tail"), "coulomb", Map.of("strength", Argument.named("k"))),
                                new FormulaTerm(TermFrame.named("core"), "-depth*exp(-(r/radius)^2)", Map.of())))));
        Model soft = Model.of(
                "soft",
                List.of(Curve.of("V", List.of(new FormulaTerm(TermFrame.named("well"), "-k/(r+radius)", Map.of())))));
        PairSystem pair =
                PairSystem.of("X", ParticleCatalogue.STANDARD.body("e-"), ParticleCatalogue.STANDARD.body("p"));
        return new ModelDocument(
                Constants.EDITION,
                ParticleCatalogue.EDITION,
                "spectroscopic",
                LabelConvention.ATOMIC,
                Weighting.KNOWN,
                List.of(pair),
                parameters,
                List.of(screened, soft),
                List.of(line("d1", 1, 0, "82000.1", "0.2"), line("d2", 0, 1, "83000.4", "0.2")),
                List.of(new DataGroup("lamp", "", DataGroup.Kind.UNKNOWN_OFFSET, null, "cm^-1")));
    }

    private static Datum line(String id, int orbital, int index, String value, String sigma) {
        return Datum.of(
                id,
                List.of(
                        new Datum.Contribution(ExactNumber.ONE, level(orbital, index)),
                        new Datum.Contribution(new ExactNumber("-1"), level(0, 0))),
                Transform.NONE,
                new ExactNumber(value),
                "cm^-1",
                new ExactNumber(sigma));
    }

    /** A level of the only system. */
    public static LevelKey level(int orbital, int index) {
        return new LevelKey("X", "V", ChannelKey.ofOrbital(orbital), index);
    }

    /** A session on that document. */
    public static ProjectSession session() {
        return new ProjectSession(Project.of("invented", document()), null);
    }
}
