package org.modewright.exchange;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;

import org.modewright.exchange.internal.AtomicOutput;
import org.modewright.exchange.internal.tables.TableText;
import org.modewright.fem.Assembly;
import org.modewright.fem.Components;

/**
 * The matrices of a model as files: {@code NAME.K.mtx} and {@code NAME.M.mtx} over the free degrees of freedom, and {@code NAME.dofs.csv}
 * with the node and the component of each row. Everything in SI: N/m, N, N m; kg, kg m, kg m2.
 */
public final class MatrixFiles {

    private MatrixFiles() {
    }

    /**
     * Writes the three files.
     *
     * @param name a path that ends with {@code .mtx}
     * @return the files written
     */
    public static List<Path> write(Assembly assembly, Path name) throws IOException {
        String file = name.getFileName().toString();
        String base = file.substring(0, file.length() - MatrixMarket.EXTENSION.length());
        Path stiffness = name.resolveSibling(base + ".K.mtx");
        Path mass = name.resolveSibling(base + ".M.mtx");
        Path dofs = name.resolveSibling(base + ".dofs.csv");
        String model = "model: " + assembly.snapshot().name();
        MatrixMarket.write(assembly.stiffness(), stiffness, model, "stiffness; N and m");
        MatrixMarket.write(assembly.mass(), mass, model, "mass; kg and m");
        AtomicOutput.write(dofs, dofs(assembly).bytes());
        return List.of(stiffness, mass, dofs);
    }

    private static TableText dofs(Assembly assembly) {
        TableText table = new TableText(List.of("row", "node", "component"));
        for (int row = 0; row < assembly.freeDofs(); row++) {
            table.number(row + 1).text(assembly.snapshot().nodes().get(assembly.nodeOf(row)).name())
                    .text(Components.inFiles(assembly.componentOf(row))).end();
        }
        return table;
    }
}
