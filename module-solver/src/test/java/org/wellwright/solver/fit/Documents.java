package org.wellwright.solver.fit;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
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
import org.wellwright.solver.pair.Body;
import org.wellwright.solver.pair.PairSystem;
import org.wellwright.solver.pair.ParticleCatalogue;
import org.wellwright.solver.potential.Argument;
import org.wellwright.solver.potential.FormulaTerm;
import org.wellwright.solver.potential.TermFrame;
import org.wellwright.solver.units.Constants;
import org.wellwright.solver.units.ExactNumber;

/** Small documents for tests. */
public final class Documents {
    private Documents() {}

    /** An exact number. */
    public static ExactNumber number(String text) {
        return new ExactNumber(text);
    }

    /** A free scalar. */
    public static Parameter free(String name, String unit, String value) {
        return Parameter.scalar(name, unit, Setting.free(number(value)));
    }

    /** A fixed scalar. */
    public static Parameter fixed(String name, String unit, String value) {
        return Parameter.scalar(name, unit, Setting.fixed(number(value)));
    }

    /** A curve "ground" with one formula and the energy origin given. */
    public static Curve curve(String formula, Argument origin) {
        Curve plain = Curve.of("ground", List.of(new FormulaTerm(TermFrame.named("main"), formula, Map.of())));
        return plain.withEnergyOrigin(origin);
    }

    /** A model of one curve "ground" with one formula. */
    public static Model model(String name, String formula) {
        return Model.of(name, List.of(curve(formula, Argument.ZERO)));
    }

    /** A spinless level of the curve "ground". */
    public static LevelKey level(String system, int orbital, int index) {
        return new LevelKey(system, "ground", ChannelKey.ofOrbital(orbital), index);
    }

    /** c times a level. */
    public static Datum.Contribution times(String coefficient, LevelKey level) {
        return new Datum.Contribution(number(coefficient), level);
    }

    /** The electron–proton pair "H" and the electron–deuteron pair "D". */
    public static List<PairSystem> hydrogens() {
        Body electron = ParticleCatalogue.STANDARD.body("e-");
        return List.of(
                PairSystem.of("H", electron, ParticleCatalogue.STANDARD.body("p")),
                PairSystem.of("D", electron, ParticleCatalogue.STANDARD.body("d")));
    }

    /** A document with known uncertainties. */
    public static ModelDocument document(
            String units,
            List<PairSystem> systems,
            List<Parameter> parameters,
            List<Model> models,
            List<Datum> data,
            List<DataGroup> groups) {
        return new ModelDocument(
                Constants.EDITION,
                ParticleCatalogue.EDITION,
                units,
                LabelConvention.ATOMIC,
                Weighting.KNOWN,
                systems,
                parameters,
                models,
                data,
                groups);
    }

    /** A level energy as a datum. */
    public static Datum energy(String id, LevelKey level, double value, String unit, double sigma) {
        return Datum.of(
                id, List.of(times("1", level)), Transform.NONE, ExactNumber.of(value), unit, ExactNumber.of(sigma));
    }

    /** A line between two levels as a datum. */
    public static Datum line(
            String id, LevelKey upper, LevelKey lower, Transform transform, double value, String unit, double sigma) {
        return Datum.of(
                id,
                List.of(times("1", upper), times("-1", lower)),
                transform,
                ExactNumber.of(value),
                unit,
                ExactNumber.of(sigma));
    }

    /** The data with the values that a comparison's first model predicts, group errors included. */
    public static List<Datum> withPredictedValues(ModelDocument document, Comparison comparison) {
        List<Datum> data = new ArrayList<>();
        for (int i = 0; i < document.data().size(); i++) {
            double predicted = comparison.models().get(0).rows().get(i).predicted();
            data.add(document.data()
                    .get(i)
                    .withValue(
                            ExactNumber.of(predicted),
                            document.data().get(i).sigmaMinus(),
                            document.data().get(i).sigmaPlus(),
                            document.data().get(i).limit(),
                            document.data().get(i).unit()));
        }
        return data;
    }
}
