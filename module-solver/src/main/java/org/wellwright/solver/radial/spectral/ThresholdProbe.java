package org.wellwright.solver.radial.spectral;

import org.wellwright.solver.numerics.CondensedPencil;
import org.wellwright.solver.numerics.Element;

/**
 * Whether the solution at the threshold has a node beyond the mesh, that is a level so near to the threshold that it
 * reaches further: the mesh is continued at the threshold until V no longer matters, and closed there by the exterior
 * solution r^(½−ν), ν² = λ + ¼.
 */
final class ThresholdProbe {
    private final ChannelPotentials potentials;
    private final Layout layout;
    private final CondensedPencil pencil;

    ThresholdProbe(ChannelPotentials potentials, Layout layout, CondensedPencil pencil) {
        this.potentials = potentials;
        this.layout = layout;
        this.pencil = pencil;
    }

    boolean moreBeyond(int found) {
        Element[] elements = layout.continued(pencil.elements());
        double edge = layout.lastEdge();
        CondensedPencil longer = elements.length == pencil.elements().length ? pencil : MeshChoice.chain(elements);
        return longer.work().countOpen(potentials.threshold(), potentials.exteriorStiffness(edge)) > found;
    }
}
