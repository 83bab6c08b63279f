package org.wellwright.solver.model;

/** In how many dimensions the two bodies move against each other. */
public enum Geometry {
    /** Three dimensions, centrifugal constant l(l+1). */
    SPACE,
    /** Two dimensions, centrifugal constant m² − ¼; l stands for |m|. */
    PLANE;

    /** λ in κλ/r². */
    public double centrifugal(int orbital) {
        return this == SPACE ? (double) orbital * (orbital + 1) : (double) orbital * orbital - 0.25;
    }
}
