package org.wellwright.viewer.plot;

import java.util.List;
import org.wellwright.solver.model.Datum;
import org.wellwright.solver.model.Datum.Contribution;

/** Names of data short enough for an axis. */
public final class DatumText {
    private DatumText() {}

    /** "3p" for a level, "3p → 3s" for a line, otherwise the datum's id. */
    public static String of(Datum datum, LevelText names) {
        List<Contribution> levels = datum.levels();
        if (!datum.denominator().isEmpty()) {
            return datum.id();
        }
        if (levels.size() == 1 && levels.get(0).coefficient().value() == 1) {
            return names.full(levels.get(0).level());
        }
        if (levels.size() == 2) {
            double first = levels.get(0).coefficient().value();
            double second = levels.get(1).coefficient().value();
            if (first == 1 && second == -1) {
                return names.full(levels.get(0).level()) + " → "
                        + names.level(levels.get(1).level());
            }
            if (first == -1 && second == 1) {
                return names.full(levels.get(1).level()) + " → "
                        + names.level(levels.get(0).level());
            }
        }
        return datum.id();
    }
}
