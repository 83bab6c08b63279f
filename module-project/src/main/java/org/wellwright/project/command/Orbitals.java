package org.wellwright.project.command;

import java.util.ArrayList;
import java.util.List;
import org.wellwright.solver.units.Names;

/** The option {@code --l}. */
final class Orbitals {
    private static final int MOST = 1000;

    private Orbitals() {}

    /** The values of "2", "0..3" or "0,2,4". */
    static List<Integer> parse(String text) {
        List<Integer> orbitals = new ArrayList<>();
        for (String part : text.split(",", -1)) {
            int dots = part.indexOf("..");
            int from = Input.whole("--l", dots < 0 ? part : part.substring(0, dots), 0, 10_000);
            int to = dots < 0 ? from : Input.whole("--l", part.substring(dots + 2), 0, 10_000);
            if (to < from) {
                throw new UsageException(
                        "--l is " + Names.shortened(text) + ", which runs backwards", "write " + to + ".." + from);
            }
            for (int orbital = from; orbital <= to; orbital++) {
                if (orbitals.contains(orbital)) {
                    throw new UsageException("--l names l = " + orbital + " twice", "name it once");
                }
                orbitals.add(orbital);
                if (orbitals.size() > MOST) {
                    throw new UsageException("--l names more than " + MOST + " values", "ask for fewer at a time");
                }
            }
        }
        return orbitals;
    }
}
