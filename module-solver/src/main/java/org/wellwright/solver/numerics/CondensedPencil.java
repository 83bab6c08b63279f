package org.wellwright.solver.numerics;

/** A chain of elements, condensed to its edges: counts of eigenvalues below a shift and null vectors near one. */
public interface CondensedPencil {
    /** Scratch to work with; one per thread. */
    Work work();

    /** The elements in order; not to be changed. */
    Element[] elements();

    /** The state of the last shift. */
    interface Work {
        /** Number of eigenvalues below σ. */
        int count(double shift);

        /**
         * Number of eigenvalues below σ if the outer end is not held at zero but closed by a quadratic form.
         *
         * @param boundary the form's value for u_c = 1 at the end, one per channel
         */
        int countOpen(double shift, double[] boundary);

        /**
         * Factorises at σ and makes the vector of the twisted factorisation.
         *
         * @param allowed elements that may carry the twist, or null for all
         */
        void solve(double shift, boolean[] allowed);

        /**
         * Solves (A − σM) x = b at the shift of the last {@link #solve}, the unknown of its twist held at zero; the
         * result stands in {@link #vertices} and {@link #amplitudes}.
         *
         * @param vertexLoad b at the inner edges, {@code [v * C + c]}; destroyed
         * @param modeLoad b of the modes, laid out as {@link #amplitudes}
         */
        void respond(double[] vertexLoad, double[] modeLoad);

        /** Eigenvalues below the shift of {@link #solve}. */
        int below();

        /** Rayleigh quotient of the vector minus the shift. */
        double correction();

        /** Values at the inner edges, {@code [v * C + c]}. */
        double[] vertices();

        /** Mode amplitudes; mode k of element e is at {@code first(e) + k * step()}. */
        double[] amplitudes();

        /** Where the amplitudes of an element start. */
        int first(int element);

        /** Distance of the amplitudes of neighbouring modes. */
        int step();
    }
}
