package org.wellwright.branding;

/**
 * How a colour looks to readers with all cones or with one kind missing.
 *
 * <p>Source: G. M. Machado, M. M. Oliveira, L. A. F. Fernandes (2009), "A physiologically-based model for simulation of
 * color vision deficiency", severity 1.0, on linear sRGB; coefficients from memory, with the check that white stays
 * white.
 */
enum ColourVision {
    FULL(1, 0, 0, 0, 1, 0, 0, 0, 1),
    NO_LONG(0.152286, 1.052583, -0.204868, 0.114503, 0.786281, 0.099216, -0.003882, -0.048116, 1.051998),
    NO_MIDDLE(0.367322, 0.860646, -0.227968, 0.280085, 0.672501, 0.047413, -0.011820, 0.042940, 0.968881),
    NO_SHORT(1.255528, -0.076749, -0.178779, -0.078411, 0.930809, 0.147602, 0.004733, 0.691367, 0.303900);

    private final double[] rows;

    ColourVision(double... rows) {
        this.rows = rows;
    }

    /** What row i adds up to: 1 when grey stays grey. */
    double rowSum(int i) {
        return rows[3 * i] + rows[3 * i + 1] + rows[3 * i + 2];
    }

    OkLab see(OkLab colour) {
        double[] rgb = colour.toLinear();
        double[] seen = new double[3];
        for (int i = 0; i < 3; i++) {
            seen[i] = Math.min(
                    1, Math.max(0, rows[3 * i] * rgb[0] + rows[3 * i + 1] * rgb[1] + rows[3 * i + 2] * rgb[2]));
        }
        return OkLab.ofLinear(seen[0], seen[1], seen[2]);
    }
}
