package org.wellwright.project;

import java.util.List;
import org.wellwright.solver.model.Curve;
import org.wellwright.solver.model.LabelConvention;
import org.wellwright.solver.model.Model;
import org.wellwright.solver.model.ModelDocument;
import org.wellwright.solver.model.Parameter;
import org.wellwright.solver.model.Setting;
import org.wellwright.solver.model.Weighting;
import org.wellwright.solver.pair.ParticleCatalogue;
import org.wellwright.solver.potential.FormulaTerm;
import org.wellwright.solver.potential.TermFrame;
import org.wellwright.solver.units.Constants;
import org.wellwright.solver.units.ExactNumber;

/** Small documents for tests. */
public final class Documents {
    private Documents() {}

    /** One electron, one proton, −a/r, atomic units. */
    public static ModelDocument hydrogen(String a) {
        return new ModelDocument(
                Constants.EDITION,
                ParticleCatalogue.EDITION,
                "atomic",
                LabelConvention.ATOMIC,
                Weighting.KNOWN,
                List.of(ParticleCatalogue.STANDARD.pair("e-,p")),
                List.of(Parameter.scalar("a", "hartree bohr", Setting.free(new ExactNumber(a)))),
                List.of(Model.of(
                        "coulomb",
                        List.of(Curve.of(
                                "V",
                                List.of(new FormulaTerm(TermFrame.named("term 1"), "-a/r", java.util.Map.of())))))),
                List.of(),
                List.of());
    }
}
