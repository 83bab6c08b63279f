package org.wellwright.editor.edit;

/**
 * A place in the models of a document, by indices from 0.
 *
 * @param model the model; −1 for none
 * @param curve the curve; −1 for the model itself
 * @param term the term; −1 for the curve itself
 */
public record TermPath(int model, int curve, int term) {
    /** No place. */
    public static final TermPath NONE = new TermPath(-1, -1, -1);

    /** A model. */
    public static TermPath model(int model) {
        return new TermPath(model, -1, -1);
    }

    /** A curve. */
    public static TermPath curve(int model, int curve) {
        return new TermPath(model, curve, -1);
    }

    /** What it points to. */
    public Kind kind() {
        return model < 0 ? Kind.NONE : curve < 0 ? Kind.MODEL : term < 0 ? Kind.CURVE : Kind.TERM;
    }

    /** Its index among its siblings. */
    public int index() {
        return switch (kind()) {
            case NONE -> -1;
            case MODEL -> model;
            case CURVE -> curve;
            case TERM -> term;
        };
    }

    /** The same with another index among its siblings. */
    public TermPath at(int index) {
        return switch (kind()) {
            case NONE -> this;
            case MODEL -> new TermPath(index, -1, -1);
            case CURVE -> new TermPath(model, index, -1);
            case TERM -> new TermPath(model, curve, index);
        };
    }

    /** The JSON pointer of the place. */
    public String pointer() {
        return switch (kind()) {
            case NONE -> "/models";
            case MODEL -> "/models/" + model;
            case CURVE -> "/models/" + model + "/curves/" + curve;
            case TERM -> "/models/" + model + "/curves/" + curve + "/terms/" + term;
        };
    }

    /** What a path points to. */
    public enum Kind {
        /** Nothing. */
        NONE,
        /** A model. */
        MODEL,
        /** A curve. */
        CURVE,
        /** A term. */
        TERM
    }
}
