package org.wellwright.solver.radial.spectral;

import org.wellwright.solver.numerics.CondensedPencil;

/** What the states of one mesh share: its edges, its pencil and V on its nodes. Nothing in it changes. */
final class MeshData {
    private final double[] edges;
    private final CondensedPencil pencil;
    private final CheckGrid grid;
    private final boolean innerWall;
    private final boolean outerWall;

    /**
     * A mesh.
     *
     * @param innerWall whether the first edge is a hard wall; else it is the origin or a cut
     * @param outerWall whether the last edge is a hard wall; else it is a cut
     */
    MeshData(double[] edges, CondensedPencil pencil, CheckGrid grid, boolean innerWall, boolean outerWall) {
        this.edges = edges;
        this.pencil = pencil;
        this.grid = grid;
        this.innerWall = innerWall;
        this.outerWall = outerWall;
    }

    double[] edges() {
        return edges;
    }

    CondensedPencil pencil() {
        return pencil;
    }

    CheckGrid grid() {
        return grid;
    }

    Quotient quotient() {
        return new Quotient(pencil.elements(), edges, grid, innerWall, outerWall);
    }
}
