package org.wellwright.editor.systems;

import java.util.ArrayList;
import java.util.List;
import org.wellwright.editor.edit.Faults;
import org.wellwright.editor.edit.SystemEdits;
import org.wellwright.solver.InvalidModelException;
import org.wellwright.solver.model.ModelDocument;
import org.wellwright.solver.model.ParameterPool;
import org.wellwright.solver.pair.Body;
import org.wellwright.solver.pair.BodyMass;
import org.wellwright.solver.pair.PairSystem;
import org.wellwright.solver.pair.ParticleCatalogue;
import org.wellwright.solver.units.UnitSystem;

/**
 * What the window of pair systems shows.
 *
 * @param systems the systems in order
 */
record SystemsViewModel(List<Row> systems) {
    /**
     * One system.
     *
     * @param index its index
     * @param system the system
     * @param summary its bodies in a few words
     * @param derived reduced mass and kinetic constant, or why there are none
     * @param problem what is wrong with it; empty if nothing
     */
    record Row(int index, PairSystem system, String summary, String derived, String problem) {}

    SystemsViewModel {
        systems = List.copyOf(systems);
    }

    static SystemsViewModel of(ModelDocument document) {
        Faults faults = Faults.of(document);
        List<Row> rows = new ArrayList<>();
        for (int i = 0; i < document.systems().size(); i++) {
            PairSystem system = document.systems().get(i);
            rows.add(new Row(
                    i,
                    system,
                    title(system.first()) + " and " + title(system.second()),
                    derived(system, document),
                    faults.at("/systems/" + i)));
        }
        return new SystemsViewModel(rows);
    }

    private static String title(Body body) {
        return body.label().isBlank() ? SystemEdits.massText(body.mass()) : body.label();
    }

    private static String derived(PairSystem system, ModelDocument document) {
        try {
            ParameterPool pool = ParameterPool.of(document);
            UnitSystem units = pool.units();
            double mass = pool.reducedMass(system.id(), pool.typedValues()).value();
            double kinetic = pool.kinetic(system.id(), pool.typedValues()).value();
            return "reduced mass %.10g %s, ħ²/2μ = %.10g %s %s²"
                    .formatted(
                            mass,
                            units.mass().printed(),
                            kinetic,
                            units.energy().printed(),
                            units.length().printed());
        } catch (InvalidModelException e) {
            return "no reduced mass: " + e.problem().sentence();
        }
    }

    /** What the table says of a body, for a hint; empty for one that is not from the table. */
    static String origin(Body body) {
        if (!(body.mass() instanceof BodyMass.Catalogued listed)
                || !ParticleCatalogue.STANDARD.contains(listed.particle())) {
            return "";
        }
        var particle = ParticleCatalogue.STANDARD.find(listed.particle());
        return "%s: %s(%s) %s; %s"
                .formatted(particle.title(), particle.mass(), particle.sigma(), particle.unit(), particle.source());
    }
}
