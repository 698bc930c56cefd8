package org.modewright.exchange.samples;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.Map;

import org.modewright.exchange.TablePackage;
import org.modewright.model.ModelFile;
import org.modewright.model.structure.StructuralModel;

/** All models that come with the program, as they are generated. Run with the folder of the samples to write them anew. */
public final class SampleModels {

    private SampleModels() {
    }

    /** The models by name. */
    public static Map<String, StructuralModel> all() {
        Map<String, StructuralModel> models = new LinkedHashMap<>();
        models.put("demo", DemoModel.create());
        models.put("tip-mass", TeachingModels.tipMass());
        models.put("two-storeys", TeachingModels.twoStoreys());
        models.put("cantilever", TeachingModels.cantilever());
        models.put("three-storeys", TeachingModels.threeStoreys());
        models.put("mass-chain", TeachingModels.massChain());
        return models;
    }

    /**
     * Writes every model file, and the demonstration as a table package too.
     *
     * @param arguments the folder {@code samples} of the bundle org.modewright.samples
     */
    public static void main(String[] arguments) throws IOException {
        Path folder = Path.of(arguments[0]);
        Files.createDirectories(folder);
        for (Map.Entry<String, StructuralModel> model : all().entrySet()) {
            ModelFile.save(model.getValue(), folder.resolve(model.getKey() + "." + ModelFile.EXTENSION));
        }
        TablePackage.write(DemoModel.create(), folder.resolve("demo"));
    }
}
