package org.wellwright.project.report;

import java.util.ArrayList;
import java.util.List;
import org.openide.util.lookup.ServiceProvider;
import org.wellwright.project.ReportInput;
import org.wellwright.project.ReportSection;
import org.wellwright.solver.WellwrightException;
import org.wellwright.solver.model.ModelDocument;
import org.wellwright.solver.model.ParameterPool;
import org.wellwright.solver.pair.Body;
import org.wellwright.solver.pair.BodyMass;
import org.wellwright.solver.pair.PairSystem;
import org.wellwright.solver.units.UnitSystem;

/** The pairs of bodies. */
@ServiceProvider(service = ReportSection.class)
public final class SystemsSection implements ReportSection {
    @Override
    public String id() {
        return "systems";
    }

    @Override
    public String title() {
        return "Systems";
    }

    @Override
    public int position() {
        return 100;
    }

    @Override
    public String html(ReportInput input) {
        ModelDocument document = input.project().document();
        UnitSystem units = UnitSystem.named(document.units());
        List<List<String>> rows = new ArrayList<>();
        for (PairSystem system : document.systems()) {
            rows.add(List.of(
                    system.id(),
                    system.title(),
                    body(system.first()),
                    body(system.second()),
                    reducedMass(document, system),
                    Words.hyphenated(system.massConvention()),
                    system.abundance() == null ? "" : system.abundance().text()));
        }
        return Html.table(
                        List.of(
                                "system",
                                "",
                                "first body",
                                "second body",
                                "reduced mass (" + units.mass().printed() + ")",
                                "mass convention",
                                "abundance"),
                        rows)
                + "<p>Energies are in " + Html.text(units.energy().printed()) + ", lengths in "
                + Html.text(units.length().printed())
                + (units.natural() ? ", with ħ = c = 1" : "") + ", unless a unit stands beside them.</p>\n";
    }

    private static String body(Body body) {
        String mass;
        if (body.mass() instanceof BodyMass.Typed typed) {
            String sigma = typed.sigma() == null ? "" : " ± " + typed.sigma().text();
            mass = typed.value().text() + sigma + " " + typed.unit();
        } else if (body.mass() instanceof BodyMass.Catalogued catalogued) {
            mass = "mass of " + catalogued.particle();
        } else {
            mass = "mass " + ((BodyMass.FromParameter) body.mass()).parameter();
        }
        return body.label() + " (" + mass + ", charge " + body.charge().text() + ")";
    }

    private static String reducedMass(ModelDocument document, PairSystem system) {
        try {
            ParameterPool pool = ParameterPool.of(document);
            return Digits.significant(
                    pool.reducedMass(system.id(), pool.typedValues()).value(), 8);
        } catch (WellwrightException e) {
            return "–";
        }
    }
}
