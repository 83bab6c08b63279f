package org.wellwright.solver.model;

import java.util.HashSet;
import java.util.List;
import java.util.Set;

/**
 * How the labels of a curve differ from the project's convention.
 *
 * @param principalOffsets what is added to n per l, because a nodeless core hides the inner shells
 * @param vibrationalOffset what is added to v
 */
public record LabelRule(List<PrincipalOffset> principalOffsets, int vibrationalOffset) {
    /** No difference. */
    public static final LabelRule PLAIN = new LabelRule(List.of(), 0);

    /** What is added to n in channels of one l. */
    public record PrincipalOffset(int orbital, int offset) {
        /** Checks l. */
        public PrincipalOffset {
            if (orbital < 0) {
                throw new IllegalArgumentException("l must be >= 0, got " + orbital);
            }
        }
    }

    /** Copies the list and checks that no l comes twice. */
    public LabelRule {
        principalOffsets = List.copyOf(principalOffsets);
        Set<Integer> seen = new HashSet<>();
        for (PrincipalOffset offset : principalOffsets) {
            if (!seen.add(offset.orbital())) {
                throw new IllegalArgumentException("the offset of l = %d is listed twice".formatted(offset.orbital()));
            }
        }
    }

    /** What is added to n in channels of this l; 0 if nothing is listed. */
    public int principalOffset(int orbital) {
        for (PrincipalOffset offset : principalOffsets) {
            if (offset.orbital() == orbital) {
                return offset.offset();
            }
        }
        return 0;
    }
}
