package org.modewright.samples;

import java.io.FileNotFoundException;
import java.io.IOException;
import java.io.InputStream;
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

    private static final List<String> DEMO_PACKAGE = List.of("datapackage.json", "frame_sections.csv", "gravity_loads.csv", "levels.csv",
            "mass_rule.csv", "masses.csv", "materials.csv", "members.csv", "nodes.csv", "rigid_floors.csv", "rigid_links.csv",
            "supports.csv");

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

    /** Names of the files of the demonstration as a table package. */
    public static List<String> demoPackageFiles() {
        return DEMO_PACKAGE;
    }

    /**
     * Opens a file of the demonstration's table package; the caller closes it.
     *
     * @throws IOException if there is no such file
     */
    public static InputStream openDemoPackageFile(String name) throws IOException {
        InputStream stream = DEMO_PACKAGE.contains(name) ? Samples.class.getResourceAsStream("/samples/demo/" + name) : null;
        if (stream == null) {
            throw new FileNotFoundException(name + " is not part of the demonstration's table package");
        }
        return stream;
    }
}
