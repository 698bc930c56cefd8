package org.modewright.exchange;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;

import org.modewright.exchange.internal.AtomicOutput;
import org.modewright.fem.NodePoint;
import org.modewright.modal.ModalResult;
import org.modewright.modal.Mode;

import io.jhdf.HdfFile;
import io.jhdf.WritableHdfFile;

/**
 * Mode shapes as an HDF5 file with the datasets {@code frequency} (Hz, one a mode), {@code shape} (mode &times; node &times; ux uy uz rx
 * ry rz, &phi;<sup>T</sup>M&phi; = 1 in SI) and {@code node} (names in the order of the shapes).
 * <p>
 * The bundle of the HDF5 library does not export the package of its exceptions, which are all unchecked: they are caught as such.
 */
public final class ShapesFile {

    private static final int COMPONENTS = 6;
    private static final String FREQUENCY = "frequency";
    private static final String SHAPE = "shape";
    private static final String NODE = "node";

    private ShapesFile() {
    }

    /**
     * The content of a file of shapes.
     *
     * @param frequency Hz, one a mode
     * @param shape mode, node, component
     * @param node names of the nodes
     */
    public record Shapes(double[] frequency, double[][][] shape, List<String> node) {
    }

    /**
     * Writes all modes of a result; the file is replaced as a whole.
     *
     * @throws IOException if it cannot be written, or the result has no mode
     */
    public static void write(ModalResult result, Path file) throws IOException {
        if (result.modes().isEmpty()) {
            throw new IOException(file + ": there is no mode, so there are no shapes to write");
        }
        AtomicOutput.write(file, path -> {
            try (WritableHdfFile hdf = HdfFile.write(path)) {
                hdf.putDataset(FREQUENCY, result.modes().stream().mapToDouble(Mode::frequency).toArray());
                hdf.putDataset(SHAPE, shapes(result));
                hdf.putDataset(NODE, result.nodes().stream().map(NodePoint::name).toArray(String[]::new));
            } catch (RuntimeException e) {
                throw new IOException(file + ": the shapes cannot be written: " + e.getMessage(), e);
            }
        });
    }

    private static double[][][] shapes(ModalResult result) {
        double[][][] shapes = new double[result.modes().size()][result.nodeCount()][COMPONENTS];
        for (int mode = 0; mode < shapes.length; mode++) {
            double[] shape = result.shape(mode);
            for (int node = 0; node < result.nodeCount(); node++) {
                System.arraycopy(shape, COMPONENTS * node, shapes[mode][node], 0, COMPONENTS);
            }
        }
        return shapes;
    }

    /**
     * Reads a file of shapes.
     *
     * @throws IOException if it is no HDF5 file or lacks a dataset
     */
    public static Shapes read(Path file) throws IOException {
        try (HdfFile hdf = new HdfFile(file)) {
            return new Shapes((double[]) hdf.getDatasetByPath(FREQUENCY).getData(), (double[][][]) hdf.getDatasetByPath(SHAPE).getData(),
                    List.of((String[]) hdf.getDatasetByPath(NODE).getData()));
        } catch (RuntimeException e) {
            throw new IOException(file + ": this is no file of mode shapes: " + e.getMessage(), e);
        }
    }
}
