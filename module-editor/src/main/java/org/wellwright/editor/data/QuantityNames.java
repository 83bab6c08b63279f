package org.wellwright.editor.data;

import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.wellwright.project.entry.TransformText;
import org.wellwright.solver.InvalidModelException;
import org.wellwright.solver.model.Datum;
import org.wellwright.solver.model.Transform;

/** The names of quantities with what a radius or a rate needs besides: "radius, k = 4", "rate, E2". */
final class QuantityNames {
    private static final Pattern RADIUS = Pattern.compile("radius\\s*,?\\s*k\\s*=\\s*(-?\\d{1,2})");
    private static final Pattern RATE = Pattern.compile("rate\\s*,?\\s*E\\s*(\\d{1,2})");

    private QuantityNames() {}

    static String text(Datum datum) {
        String title = TransformText.title(datum.transform());
        Datum.Detail detail = datum.detail();
        if (datum.transform() == Transform.RADIUS && detail.radiusPower() != 2) {
            return title + ", k = " + detail.radiusPower();
        }
        if (datum.transform() == Transform.RATE && detail.multipole() != 1) {
            return title + ", E" + detail.multipole();
        }
        return title;
    }

    /**
     * Reads a quantity.
     *
     * @throws InvalidModelException if it is none
     */
    static Transform transform(String text) {
        if (RADIUS.matcher(text.strip()).matches()) {
            return Transform.RADIUS;
        }
        return RATE.matcher(text.strip()).matches() ? Transform.RATE : TransformText.parse(text);
    }

    static Datum.Detail detail(String text) {
        Matcher radius = RADIUS.matcher(text.strip());
        Matcher rate = RATE.matcher(text.strip());
        if (radius.matches()) {
            return new Datum.Detail(Integer.parseInt(radius.group(1)), 1);
        }
        return rate.matches() ? new Datum.Detail(2, Integer.parseInt(rate.group(1))) : Datum.Detail.STANDARD;
    }
}
