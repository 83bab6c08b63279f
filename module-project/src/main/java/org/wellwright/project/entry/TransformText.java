package org.wellwright.project.entry;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.wellwright.solver.InvalidModelException;
import org.wellwright.solver.model.Transform;
import org.wellwright.solver.units.Names;

/** The names of measured quantities on screen and in tables. */
public final class TransformText {
    private TransformText() {}

    /** The name on screen. */
    public static String title(Transform transform) {
        return switch (transform) {
            case NONE -> "energy";
            case VACUUM_WAVELENGTH -> "vacuum wavelength";
            case AIR_WAVELENGTH -> "air wavelength";
            case FREQUENCY -> "frequency";
            case PHOTON_EMISSION -> "emitted photon";
            case PHOTON_ABSORPTION -> "absorbed photon";
            case ABSOLUTE_MASS -> "absolute mass";
            case RATIO -> "ratio";
            case RADIUS -> "radius";
            case WIDTH -> "width";
            case RATE -> "rate";
        };
    }

    /**
     * The unit that comes to mind first: wavelengths in nm, frequencies in THz; empty where it is the project's energy,
     * length or none.
     */
    public static String usualUnit(Transform transform) {
        return switch (transform) {
            case VACUUM_WAVELENGTH, AIR_WAVELENGTH -> "nm";
            case FREQUENCY -> "THz";
            default -> "";
        };
    }

    /**
     * The quantity of a name.
     *
     * @throws InvalidModelException if there is none
     */
    public static Transform parse(String text) {
        String wanted = text.strip().toLowerCase(Locale.ROOT).replace('_', ' ').replace('-', ' ');
        List<String> titles = new ArrayList<>();
        for (Transform transform : Transform.values()) {
            titles.add(title(transform));
            if (wanted.equals(title(transform))
                    || wanted.equals(transform.name().toLowerCase(Locale.ROOT).replace('_', ' '))) {
                return transform;
            }
        }
        throw new InvalidModelException(
                "'%s' is not a quantity".formatted(Typed.shortened(text)), "", Names.remedy(wanted, titles));
    }
}
