package org.wellwright.solver.pair;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.wellwright.solver.InvalidModelException;
import org.wellwright.solver.units.Constants;
import org.wellwright.solver.units.ExactNumber;
import org.wellwright.solver.units.Names;

/**
 * The mass table: leptons, mesons, light nuclei, and atoms. Immutable.
 *
 * <p>Masses of leptons and light nuclei: CODATA 2022. Atoms: the atomic mass evaluation AME 2020 (Wang, Huang, Kondev,
 * Audi and Naimi 2021, Chin. Phys. C 45, 030003).
 */
public final class ParticleCatalogue {
    /** Edition of the table, as projects pin it. */
    public static final String EDITION = Constants.EDITION + ", AME 2020";

    private static final String AME = "AME 2020: Wang et al., Chin. Phys. C 45 (2021) 030003";
    private static final String PDG = "Particle Data Group, Review of Particle Physics (2024); value from memory";

    /** The table. */
    public static final ParticleCatalogue STANDARD = new ParticleCatalogue(entries());

    private final List<Particle> particles;
    private final Map<String, Particle> byName = new LinkedHashMap<>();

    private ParticleCatalogue(List<Particle> particles) {
        this.particles = List.copyOf(particles);
        for (Particle particle : particles) {
            byName.put(particle.id(), particle);
            for (String alias : particle.aliases()) {
                byName.put(alias, particle);
            }
        }
    }

    /** All entries in the order of the table. */
    public List<Particle> particles() {
        return particles;
    }

    /** Whether there is an entry of this identifier or alias. */
    public boolean contains(String id) {
        return byName.containsKey(id);
    }

    /**
     * The entry of an identifier or alias.
     *
     * @throws InvalidModelException if there is none; names the nearest
     */
    public Particle find(String id) {
        Particle particle = byName.get(id);
        if (particle == null) {
            throw new InvalidModelException(
                    "the particle '%s' is not known".formatted(Names.shortened(id)),
                    "",
                    Names.remedy(id, byName.keySet()));
        }
        return particle;
    }

    /** A body of the table with the charge and spin that the table has. */
    public Body body(String id) {
        Particle particle = find(id);
        return new Body(
                particle.title(),
                new BodyMass.Catalogued(particle.id()),
                ExactNumber.of(particle.charge()),
                particle.twiceSpin());
    }

    /**
     * The pair that a text like "e-,p" names, in vacuum and with the masses as tabulated.
     *
     * @throws InvalidModelException if the text does not name two entries
     */
    public PairSystem pair(String text) {
        String[] parts = text.split(",", -1);
        if (parts.length != 2) {
            throw new InvalidModelException(
                    "the pair '%s' does not name two bodies".formatted(Names.shortened(text)),
                    "",
                    "write two particles with a comma between them, like e-,p");
        }
        return PairSystem.of(text, body(parts[0].strip()), body(parts[1].strip()));
    }

    private static List<Particle> entries() {
        List<Particle> table = new ArrayList<>();
        String codata = Constants.RYDBERG.source();
        light(table, "e-", "electron", "1", "0", -1, 1, codata, "e", "electron");
        light(table, "e+", "positron", "1", "0", 1, 1, codata, "positron");
        light(table, "mu-", "muon", "206.7682827", "0.0000046", -1, 1, codata, "mu", "muon");
        light(table, "mu+", "antimuon", "206.7682827", "0.0000046", 1, 1, codata, "antimuon");
        light(table, "tau-", "tau", "3477.23", "0.23", -1, 1, codata, "tau");
        light(table, "tau+", "antitau", "3477.23", "0.23", 1, 1, codata);
        meson(table, "pi-", "pion, negative", "139.57039", "0.00018", -1);
        meson(table, "pi+", "pion, positive", "139.57039", "0.00018", 1);
        meson(table, "K-", "kaon, negative", "493.677", "0.016", -1);
        meson(table, "K+", "kaon, positive", "493.677", "0.016", 1);
        light(table, "p", "proton", "1836.152673426", "0.000000032", 1, 1, codata, "proton");
        light(table, "pbar", "antiproton", "1836.152673426", "0.000000032", -1, 1, codata, "antiproton");
        light(table, "n", "neutron", "1838.68366200", "0.00000074", 0, 1, codata, "neutron");
        nucleus(table, "d", "deuteron", "3670.482967655", "0.000000063", 1, 2, codata, "deuteron");
        nucleus(table, "t", "triton", "5496.92153551", "0.00000021", 1, 1, codata, "triton");
        nucleus(table, "h", "helion", "5495.88527984", "0.00000016", 2, 1, codata, "helion");
        nucleus(table, "alpha", "alpha particle", "7294.29954171", "0.00000017", 2, 0, codata, "a");
        atom(table, "H-1", 1, "1.007825031898", "0.000000000014", "H");
        atom(table, "H-2", 1, "2.014101777844", "0.000000000015", "D");
        atom(table, "H-3", 1, "3.01604928132", "0.00000000008", "T");
        atom(table, "He-3", 2, "3.01602932197", "0.00000000006");
        atom(table, "He-4", 2, "4.00260325413", "0.00000000016");
        atom(table, "Li-6", 3, "6.01512288742", "0.00000000155");
        atom(table, "Li-7", 3, "7.01600343426", "0.00000000450");
        atom(table, "Be-9", 4, "9.012183062", "0.000000082");
        atom(table, "B-11", 5, "11.009305166", "0.000000013");
        atom(table, "C-12", 6, "12", "0");
        atom(table, "C-13", 6, "13.00335483534", "0.00000000025");
        atom(table, "N-14", 7, "14.00307400425", "0.00000000024");
        atom(table, "N-15", 7, "15.00010889827", "0.00000000062");
        atom(table, "O-16", 8, "15.99491461926", "0.00000000032");
        atom(table, "O-17", 8, "16.99913175595", "0.00000000069");
        atom(table, "O-18", 8, "17.99915961214", "0.00000000069");
        atom(table, "F-19", 9, "18.99840316207", "0.00000000088");
        atom(table, "Ne-20", 10, "19.99244017525", "0.00000000165");
        atom(table, "Na-23", 11, "22.98976928195", "0.00000000194");
        atom(table, "Mg-24", 12, "23.985041689", "0.000000013");
        atom(table, "Al-27", 13, "26.981538408", "0.000000050");
        atom(table, "Si-28", 14, "27.97692653442", "0.00000000055");
        atom(table, "S-32", 16, "31.97207117354", "0.00000000141");
        atom(table, "Cl-37", 17, "36.965902573", "0.000000055");
        atom(table, "Ar-40", 18, "39.96238312204", "0.00000000234");
        atom(table, "K-39", 19, "38.96370648482", "0.00000000489");
        atom(table, "K-41", 19, "40.96182525611", "0.00000000403");
        atom(table, "Ca-40", 20, "39.962590850", "0.000000022");
        atom(table, "Kr-84", 36, "83.91149772708", "0.00000000410");
        atom(table, "Rb-85", 37, "84.91178973604", "0.00000000537");
        atom(table, "Rb-87", 37, "86.909180529", "0.000000006");
        atom(table, "Sr-88", 38, "87.905612253", "0.000000006");
        atom(table, "Xe-132", 54, "131.90415508346", "0.00000000544");
        atom(table, "Cs-133", 55, "132.905451958", "0.000000008");
        table.add(new Particle(
                "Cl-35",
                List.of(),
                "Cl-35",
                Particle.Kind.ATOM,
                new ExactNumber("34.968852694"),
                new ExactNumber("0.000000038"),
                "u",
                0,
                -1,
                17,
                AME + "; value from memory"));
        return table;
    }

    private static void light(
            List<Particle> table,
            String id,
            String title,
            String mass,
            String sigma,
            int charge,
            int twiceSpin,
            String source,
            String... aliases) {
        table.add(new Particle(
                id,
                List.of(aliases),
                title,
                Particle.Kind.PARTICLE,
                new ExactNumber(mass),
                new ExactNumber(sigma),
                "m_e",
                charge,
                twiceSpin,
                0,
                source));
    }

    private static void nucleus(
            List<Particle> table,
            String id,
            String title,
            String mass,
            String sigma,
            int protons,
            int twiceSpin,
            String source,
            String... aliases) {
        table.add(new Particle(
                id,
                List.of(aliases),
                title,
                Particle.Kind.NUCLEUS,
                new ExactNumber(mass),
                new ExactNumber(sigma),
                "m_e",
                protons,
                twiceSpin,
                protons,
                source));
    }

    private static void meson(List<Particle> table, String id, String title, String mass, String sigma, int charge) {
        table.add(new Particle(
                id,
                List.of(),
                title,
                Particle.Kind.PARTICLE,
                new ExactNumber(mass),
                new ExactNumber(sigma),
                "MeV/c^2",
                charge,
                0,
                0,
                PDG));
    }

    private static void atom(
            List<Particle> table, String id, int protons, String mass, String sigma, String... aliases) {
        table.add(new Particle(
                id,
                List.of(aliases),
                id,
                Particle.Kind.ATOM,
                new ExactNumber(mass),
                new ExactNumber(sigma),
                "u",
                0,
                -1,
                protons,
                AME));
    }
}
