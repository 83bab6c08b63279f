package org.wellwright.editor.parts;

import java.util.List;
import java.util.Optional;
import java.util.function.BiFunction;
import java.util.function.Function;
import java.util.function.Predicate;
import org.wellwright.solver.Problem;

/**
 * A column of a {@link Grid}.
 *
 * @param title its heading
 * @param hint what it holds, shown at its heading
 * @param kind how it is shown and typed
 * @param sample a text as wide as the column should be
 * @param text the text of a row's cell
 * @param problem what is wrong with a row's cell; empty if nothing
 * @param editable whether a row's cell can be changed
 * @param take takes up what was typed into a row's cell; null for a column that is only shown
 * @param choices the texts to choose from in a {@link Kind#CHOICE}; offered and not binding in an
 *     {@link Kind#OPEN_CHOICE}
 */
public record GridColumn<R>(
        String title,
        String hint,
        Kind kind,
        String sample,
        Function<R, String> text,
        Function<R, String> problem,
        Predicate<R> editable,
        BiFunction<R, String, Optional<Problem>> take,
        Function<R, List<String>> choices) {

    /** How a column is shown and typed. */
    public enum Kind {
        /** Text. */
        TEXT,
        /** A number, aligned to the right. */
        NUMBER,
        /** A box to tick; the texts are "yes" and "no". */
        CHECK,
        /** One of several texts. */
        CHOICE,
        /** One of several texts, or another. */
        OPEN_CHOICE
    }

    /** A column that is only shown. */
    public static <R> GridColumn<R> shown(
            String title, String hint, Kind kind, String sample, Function<R, String> text) {
        return new GridColumn<>(title, hint, kind, sample, text, row -> "", row -> false, null, row -> List.of());
    }

    /** A column that can be typed into. */
    public static <R> GridColumn<R> typed(
            String title,
            String hint,
            Kind kind,
            String sample,
            Function<R, String> text,
            BiFunction<R, String, Optional<Problem>> take) {
        return new GridColumn<>(title, hint, kind, sample, text, row -> "", row -> true, take, row -> List.of());
    }

    /** The same with a test of which rows can be changed. */
    public GridColumn<R> where(Predicate<R> test) {
        return new GridColumn<>(title, hint, kind, sample, text, problem, test, take, choices);
    }

    /** The same with problems. */
    public GridColumn<R> withProblem(Function<R, String> faults) {
        return new GridColumn<>(title, hint, kind, sample, text, faults, editable, take, choices);
    }

    /** The same with texts to choose from. */
    public GridColumn<R> withChoices(Function<R, List<String>> texts) {
        return new GridColumn<>(title, hint, kind, sample, text, problem, editable, take, texts);
    }
}
