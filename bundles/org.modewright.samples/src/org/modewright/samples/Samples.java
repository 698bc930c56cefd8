package org.modewright.samples;

import java.util.List;
import java.util.Optional;

/** The models that come with the program: the demonstration and the teaching cases. */
public final class Samples {

    /** The demonstration model. */
    public static final Sample DEMO = new Sample("demo", "Quay House, Port Veldrin: five-storey frame with braces, mast and canopy");

    private static final List<Sample> ALL = List.of(DEMO,
            new Sample("tip-mass", "Massless cantilever with a mass at its tip"),
            new Sample("two-storeys", "Two-storey frame with mass on the top only"),
            new Sample("cantilever", "Cantilever with three masses"),
            new Sample("three-storeys", "Three-storey frame"),
            new Sample("mass-chain", "Masses in series on springs"));

    private Samples() {
    }

    /** All models, the demonstration first. */
    public static List<Sample> all() {
        return ALL;
    }

    /** The model of a name. */
    public static Optional<Sample> named(String name) {
        return ALL.stream().filter(sample -> sample.name().equals(name)).findFirst();
    }
}
