package org.wellwright.editor.systems;

import java.util.Optional;
import java.util.function.BiFunction;
import java.util.function.UnaryOperator;
import org.wellwright.editor.edit.Lists;
import org.wellwright.editor.edit.SystemEdits;
import org.wellwright.editor.parts.Entry;
import org.wellwright.project.ProjectSession;
import org.wellwright.project.entry.QuantityText;
import org.wellwright.solver.InvalidModelException;
import org.wellwright.solver.Problem;
import org.wellwright.solver.model.ModelDocument;
import org.wellwright.solver.pair.Body;
import org.wellwright.solver.pair.BodyMass;
import org.wellwright.solver.pair.ExchangeSymmetry;
import org.wellwright.solver.pair.MassConvention;
import org.wellwright.solver.pair.PairSystem;
import org.wellwright.solver.pair.ParticleCatalogue;
import org.wellwright.solver.units.ExactNumber;
import org.wellwright.solver.units.UnitSystem;

/** Turns what is typed in the window of pair systems into edits of its project. */
final class SystemsController {
    private final ProjectSession session;

    SystemsController(ProjectSession session) {
        this.session = session;
    }

    private ModelDocument document() {
        return session.project().document();
    }

    int add() {
        edit("Add a pair system", SystemEdits::add);
        return document().systems().size() - 1;
    }

    int duplicate(int index) {
        edit("Duplicate a pair system", document -> SystemEdits.duplicate(document, index));
        return index + 1;
    }

    Optional<Problem> remove(int index) {
        return edit("Remove a pair system", document -> SystemEdits.remove(document, index));
    }

    int move(int index, int by) {
        int to = index + by;
        if (to < 0 || to >= document().systems().size()) {
            return index;
        }
        edit("Move a pair system", document -> document.withSystems(Lists.moved(document.systems(), index, to)));
        return to;
    }

    Optional<Problem> rename(int index, String text) {
        return edit("Rename a pair system", document -> SystemEdits.rename(document, index, text));
    }

    Optional<Problem> setTitle(int index, String text) {
        return system(index, "the title", system -> system.withTitle(text.strip()));
    }

    /** A particle of the table brings its charge and spin, and its name where none was typed. */
    Optional<Problem> setMass(int index, boolean first, String text) {
        return edit("Change a mass", document -> {
            BodyMass mass = SystemEdits.mass(text, document);
            return SystemEdits.with(document, index, system -> {
                Body old = first ? system.first() : system.second();
                Body body = old.withMass(mass);
                if (mass instanceof BodyMass.Catalogued listed && !mass.equals(old.mass())) {
                    body = ParticleCatalogue.STANDARD.body(listed.particle());
                }
                PairSystem next = first ? system.withFirst(body) : system.withSecond(body);
                return mass instanceof BodyMass.FromParameter
                        ? next.withMassConvention(MassConvention.MODEL_PARAMETER)
                        : next;
            });
        });
    }

    Optional<Problem> setLabel(int index, boolean first, String text) {
        return body(index, first, "a name", (body, document) -> body.withLabel(text.strip()));
    }

    Optional<Problem> setCharge(int index, boolean first, String text) {
        return body(
                index,
                first,
                "a charge",
                (body, document) -> body.withCharge(
                        QuantityText.parse(text.replaceFirst("\\s*e\\s*$", ""), "", UnitSystem.ATOMIC)));
    }

    /** A spin as 1/2, 1, ...; nothing where it plays no role. */
    Optional<Problem> setSpin(int index, boolean first, String text) {
        return body(index, first, "a spin", (body, document) -> {
            String plain = text.strip();
            if (!plain.matches("(\\d{1,3}(/2)?)?")) {
                throw new InvalidModelException(
                        "'%s' is not a spin".formatted(plain),
                        "",
                        "write 0, 1/2, 1, ... or nothing where it plays no role");
            }
            int twice = plain.isEmpty()
                    ? -1
                    : plain.endsWith("/2")
                            ? Integer.parseInt(plain.substring(0, plain.length() - 2))
                            : 2 * Integer.parseInt(plain);
            return body.withTwiceSpin(twice);
        });
    }

    Optional<Problem> setConvention(int index, MassConvention convention) {
        return system(index, "the mass convention", system -> system.withMassConvention(convention));
    }

    Optional<Problem> setExchange(int index, ExchangeSymmetry exchange) {
        return system(index, "the exchange symmetry", system -> system.withExchange(exchange));
    }

    Optional<Problem> setPermittivity(int index, String text) {
        return system(
                index,
                "the permittivity",
                system -> system.withPermittivity(QuantityText.parse(text, "", UnitSystem.ATOMIC)));
    }

    /** A fraction, a percentage, or nothing where it plays no role. */
    Optional<Problem> setAbundance(int index, String text) {
        return system(index, "the abundance", system -> {
            String plain = text.strip();
            if (plain.isEmpty()) {
                return system.withAbundance(null);
            }
            if (plain.endsWith("%")) {
                ExactNumber percent = QuantityText.parse(plain.substring(0, plain.length() - 1), "", UnitSystem.ATOMIC);
                return system.withAbundance(
                        new ExactNumber(percent.decimal().movePointLeft(2).toString()));
            }
            return system.withAbundance(QuantityText.parse(plain, "", UnitSystem.ATOMIC));
        });
    }

    private Optional<Problem> body(
            int index, boolean first, String what, BiFunction<Body, ModelDocument, Body> change) {
        return edit(
                "Change " + what,
                document -> SystemEdits.with(
                        document,
                        index,
                        system -> first
                                ? system.withFirst(change.apply(system.first(), document))
                                : system.withSecond(change.apply(system.second(), document))));
    }

    private Optional<Problem> system(int index, String what, UnaryOperator<PairSystem> change) {
        return edit("Change " + what, document -> SystemEdits.with(document, index, change));
    }

    private Optional<Problem> edit(String label, UnaryOperator<ModelDocument> change) {
        return Entry.attempt(
                () -> session.edit(label, project -> project.withDocument(change.apply(project.document()))));
    }
}
