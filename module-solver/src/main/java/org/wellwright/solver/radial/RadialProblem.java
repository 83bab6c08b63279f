package org.wellwright.solver.radial;

import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.HexFormat;
import java.util.List;
import java.util.Objects;
import org.wellwright.solver.potential.TermEvaluator;

/**
 * One block of coupled channels (usually a single one): everything that determines its levels.
 *
 * <p>Equality and {@link #digest} follow {@link #canonical}, so equal problems have equal digests on every machine.
 *
 * @param kinetic κ = ħ²/2μ, energy·length², > 0
 * @param channels the coupled channels, at least one
 * @param common V in all channels alike (a solver evaluates it once for all problems that share it)
 * @param rest what acts in single channels or couples them, in a fixed order
 * @param innerWall radius of a hard wall, or 0 for the origin
 * @param outerWall radius of a hard wall, or +∞
 */
public record RadialProblem(
        double kinetic,
        List<RadialChannel> channels,
        TermEvaluator common,
        List<ChannelTerm> rest,
        double innerWall,
        double outerWall) {

    /** Checks the numbers and copies the lists. */
    public RadialProblem {
        channels = List.copyOf(channels);
        rest = List.copyOf(rest);
        Objects.requireNonNull(common, "common");
        if (!(kinetic > 0) || Double.isInfinite(kinetic)) {
            throw new IllegalArgumentException("the kinetic constant must be positive and finite, got " + kinetic);
        }
        if (channels.isEmpty()) {
            throw new IllegalArgumentException("a problem needs at least one channel");
        }
        if (!(innerWall >= 0) || !(outerWall > innerWall)) {
            throw new IllegalArgumentException(
                    "walls need 0 <= inner < outer, got %s, %s".formatted(innerWall, outerWall));
        }
        for (ChannelTerm term : rest) {
            if (term.column() >= channels.size()) {
                throw new IllegalArgumentException(
                        "a channel term names channel %d of %d".formatted(term.column(), channels.size()));
            }
        }
    }

    /** A single channel l from the origin to infinity. */
    public static RadialProblem single(double kinetic, int orbital, TermEvaluator potential) {
        return new RadialProblem(
                kinetic, List.of(RadialChannel.of(orbital)), potential, List.of(), 0, Double.POSITIVE_INFINITY);
    }

    /** The complete text of the problem; numbers are written exactly. */
    public String canonical() {
        StringBuilder text = new StringBuilder(160);
        text.append("kinetic ").append(Double.toHexString(kinetic));
        text.append("\nwalls ")
                .append(Double.toHexString(innerWall))
                .append(' ')
                .append(Double.toHexString(outerWall));
        for (RadialChannel channel : channels) {
            text.append("\nchannel ")
                    .append(channel.orbital())
                    .append(' ')
                    .append(Double.toHexString(channel.centrifugal()));
            text.append(' ').append(Double.toHexString(channel.threshold()));
        }
        text.append("\ncommon ").append(common.canonical());
        for (ChannelTerm term : rest) {
            text.append("\nterm ")
                    .append(term.row())
                    .append(' ')
                    .append(term.column())
                    .append(' ')
                    .append(term.potential().canonical());
        }
        return text.toString();
    }

    /** SHA-256 of {@link #canonical}, 64 hexadecimal digits. */
    public String digest() {
        try {
            byte[] hash =
                    MessageDigest.getInstance("SHA-256").digest(canonical().getBytes(StandardCharsets.UTF_8));
            return HexFormat.of().formatHex(hash);
        } catch (NoSuchAlgorithmException e) {
            throw new IllegalStateException("every Java platform has SHA-256", e);
        }
    }

    @Override
    public boolean equals(Object other) {
        return other instanceof RadialProblem problem && canonical().equals(problem.canonical());
    }

    @Override
    public int hashCode() {
        return canonical().hashCode();
    }
}
