package org.wellwright.viewer.plot;

/** A run of points of a curve. Immutable. */
public final class Points {
    private final double[] x;
    private final double[] y;

    private Points(double[] x, double[] y) {
        this.x = x;
        this.y = y;
    }

    /** Copies both arrays, shape [n]; a y that is not finite breaks the line. */
    public static Points of(double[] x, double[] y) {
        if (x.length != y.length) {
            throw new IllegalArgumentException("points need as many x as y, got %d, %d".formatted(x.length, y.length));
        }
        return new Points(x.clone(), y.clone());
    }

    /** Number of points. */
    public int size() {
        return x.length;
    }

    /** x of the i-th point. */
    public double x(int i) {
        return x[i];
    }

    /** y of the i-th point. */
    public double y(int i) {
        return y[i];
    }
}
