package org.wellwright.solver.model;

import java.util.HashSet;
import java.util.List;
import java.util.Objects;
import java.util.Set;

/**
 * One candidate for the force: its curves, which systems it serves, how far it may be wrong.
 *
 * @param name name, unique in the project
 * @param note what it stands for; may be empty
 * @param systems ids of the pair systems it serves; empty for all
 * @param curves its curves, at least one
 * @param couplings what couples its curves; empty as a rule
 * @param geometry dimensions of the motion
 * @param error σ_mod
 */
public record Model(
        String name,
        String note,
        List<String> systems,
        List<Curve> curves,
        List<CurveCoupling> couplings,
        Geometry geometry,
        ModelError error) {

    /** Copies the lists and checks names. */
    public Model {
        Objects.requireNonNull(note, "note");
        Objects.requireNonNull(geometry, "geometry");
        Objects.requireNonNull(error, "error");
        systems = List.copyOf(systems);
        curves = List.copyOf(curves);
        couplings = List.copyOf(couplings);
        if (name.isBlank()) {
            throw new IllegalArgumentException("a model needs a name");
        }
        if (curves.isEmpty()) {
            throw new IllegalArgumentException("the model '%s' needs at least one curve".formatted(name));
        }
        Set<String> seen = new HashSet<>();
        for (Curve curve : curves) {
            if (!seen.add(curve.name())) {
                throw new IllegalArgumentException("the model '%s' has two curves '%s'".formatted(name, curve.name()));
            }
        }
    }

    /** A model of uncoupled curves in space that serves all systems and is taken as exact. */
    public static Model of(String name, List<Curve> curves) {
        return new Model(name, "", List.of(), curves, List.of(), Geometry.SPACE, ModelError.NONE);
    }

    /** Whether it serves a system. */
    public boolean serves(String system) {
        return systems.isEmpty() || systems.contains(system);
    }

    /** The curve of a name, or null. */
    public Curve curve(String curveName) {
        for (Curve curve : curves) {
            if (curve.name().equals(curveName)) {
                return curve;
            }
        }
        return null;
    }

    /** The same with another name. */
    public Model withName(String newName) {
        return new Model(newName, note, systems, curves, couplings, geometry, error);
    }

    /** The same with another note. */
    public Model withNote(String newNote) {
        return new Model(name, newNote, systems, curves, couplings, geometry, error);
    }

    /** The same with other systems. */
    public Model withSystems(List<String> newSystems) {
        return new Model(name, note, newSystems, curves, couplings, geometry, error);
    }

    /** The same with other curves. */
    public Model withCurves(List<Curve> newCurves) {
        return new Model(name, note, systems, newCurves, couplings, geometry, error);
    }

    /** The same with other couplings. */
    public Model withCouplings(List<CurveCoupling> newCouplings) {
        return new Model(name, note, systems, curves, newCouplings, geometry, error);
    }

    /** The same with another geometry. */
    public Model withGeometry(Geometry newGeometry) {
        return new Model(name, note, systems, curves, couplings, newGeometry, error);
    }

    /** The same with another error. */
    public Model withError(ModelError newError) {
        return new Model(name, note, systems, curves, couplings, geometry, newError);
    }
}
