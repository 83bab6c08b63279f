package org.wellwright.solver.potential;

import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;
import org.openide.util.Lookup;
import org.wellwright.solver.InvalidModelException;

/** The families of potentials that the Lookup knows. */
public final class FamilyCatalogue {
    private FamilyCatalogue() {}

    /** All families, sorted by id. */
    public static List<PotentialFamily> families() {
        return Lookup.getDefault().lookupAll(PotentialFamily.class).stream()
                .<PotentialFamily>map(family -> family)
                .sorted(Comparator.comparing(PotentialFamily::id))
                .toList();
    }

    /** The family with this id, if there is one. */
    public static Optional<PotentialFamily> find(String id) {
        return families().stream().filter(family -> family.id().equals(id)).findFirst();
    }

    /**
     * The family with this id.
     *
     * @throws InvalidModelException if there is none; names those that there are
     */
    public static PotentialFamily require(String id) {
        return find(id).orElseThrow(() -> new InvalidModelException(
                "the family of potentials '" + id + "' is not known",
                "",
                "use one of " + families().stream().map(PotentialFamily::id).collect(Collectors.joining(", "))));
    }
}
