package org.modewright.codegen;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.stream.Stream;
import org.eclipse.emf.codegen.ecore.generator.Generator;
import org.eclipse.emf.codegen.ecore.generator.GeneratorAdapterFactory;
import org.eclipse.emf.codegen.ecore.genmodel.GenModel;
import org.eclipse.emf.codegen.ecore.genmodel.GenModelPackage;
import org.eclipse.emf.codegen.ecore.genmodel.generator.GenBaseGeneratorAdapter;
import org.eclipse.emf.codegen.ecore.genmodel.generator.GenModelGeneratorAdapterFactory;
import org.eclipse.emf.common.util.BasicMonitor;
import org.eclipse.emf.common.util.Diagnostic;
import org.eclipse.emf.common.util.URI;
import org.eclipse.emf.ecore.plugin.EcorePlugin;
import org.eclipse.emf.ecore.resource.ResourceSet;
import org.eclipse.emf.ecore.resource.impl.ResourceSetImpl;
import org.eclipse.emf.ecore.xmi.impl.EcoreResourceFactoryImpl;

/**
 * Generates the code of the structural model and of its item providers from the generator model, outside Eclipse.
 *
 * <p>The generator always writes into an empty scratch folder, so that nothing is merged with what is there: the folders {@code src-gen} hold generated files and nothing else.
 */
public final class StructureGenerator {

    /** The bundles that have generated code; each keeps it in {@link #SOURCE_FOLDER}. */
    public static final List<String> BUNDLES = List.of("org.modewright.model", "org.modewright.model.edit");

    /** Folder of generated code inside a bundle. */
    public static final String SOURCE_FOLDER = "src-gen";

    private static final String GENERATOR_MODEL = "org.modewright.model/model/structure.genmodel";

    private final Path bundles;

    /**
     * @param bundles folder that holds the bundles, with the generator model in {@code org.modewright.model/model}
     */
    public StructureGenerator(Path bundles) {
        this.bundles = bundles.toAbsolutePath().normalize();
    }

    /**
     * Regenerates the code of the bundles in place.
     *
     * @param arguments the folder of the bundles, and a scratch folder, which is emptied
     * @throws IOException if files cannot be read or written
     */
    public static void main(String[] arguments) throws IOException {
        if (arguments.length != 2) {
            throw new IllegalArgumentException("Expected two arguments: the folder of the bundles and a scratch folder");
        }
        StructureGenerator generator = new StructureGenerator(Path.of(arguments[0]));
        Path scratch = Path.of(arguments[1]);
        generator.generate(scratch);
        generator.replaceSources(scratch);
    }

    /**
     * Generates into a scratch folder, which is emptied first; the code lands in {@code scratch/BUNDLE/src-gen}.
     *
     * @param scratch the folder to write to
     * @throws IOException if files cannot be read or written
     * @throws IllegalStateException if the generator model is at fault
     */
    public void generate(Path scratch) throws IOException {
        delete(scratch);
        for (String bundle : BUNDLES) {
            Path project = Files.createDirectories(scratch.toAbsolutePath().resolve(bundle));
            EcorePlugin.getPlatformResourceMap().put(bundle, URI.createFileURI(project + "/"));
        }
        GenModel model = loadGeneratorModel();
        Generator generator = new Generator();
        generator.setInput(model);
        for (String kind : List.of(GenBaseGeneratorAdapter.MODEL_PROJECT_TYPE, GenBaseGeneratorAdapter.EDIT_PROJECT_TYPE)) {
            check(generator.generate(model, kind, new BasicMonitor()));
        }
    }

    private GenModel loadGeneratorModel() {
        GenModelPackage.eINSTANCE.eClass();
        GeneratorAdapterFactory.Descriptor.Registry.INSTANCE.addDescriptor(GenModelPackage.eNS_URI, GenModelGeneratorAdapterFactory.DESCRIPTOR);
        ResourceSet resources = new ResourceSetImpl();
        Map<String, Object> factories = resources.getResourceFactoryRegistry().getExtensionToFactoryMap();
        factories.put("ecore", new EcoreResourceFactoryImpl());
        factories.put("genmodel", new EcoreResourceFactoryImpl());
        URI file = URI.createFileURI(bundles.resolve(GENERATOR_MODEL).toString());
        GenModel model = (GenModel) resources.getResource(file, true).getContents().get(0);
        model.reconcile();
        model.setCanGenerate(true);
        check(model.diagnose());
        return model;
    }

    private static void check(Diagnostic diagnostic) {
        if (diagnostic.getSeverity() >= Diagnostic.WARNING) {
            throw new IllegalStateException(diagnostic.getMessage() + " " + diagnostic.getChildren());
        }
    }

    private void replaceSources(Path scratch) throws IOException {
        for (String bundle : BUNDLES) {
            Path target = bundles.resolve(bundle).resolve(SOURCE_FOLDER);
            Map<Path, byte[]> generated = read(scratch.resolve(bundle).resolve(SOURCE_FOLDER));
            delete(target);
            for (Map.Entry<Path, byte[]> file : generated.entrySet()) {
                Path path = target.resolve(file.getKey());
                Files.createDirectories(path.getParent());
                Files.write(path, file.getValue());
            }
        }
    }

    /**
     * Reads every file below a folder.
     *
     * @param folder the folder; none is as good as an empty one
     * @return contents by path relative to the folder, in order of the paths
     * @throws IOException if a file cannot be read
     */
    public static Map<Path, byte[]> read(Path folder) throws IOException {
        Map<Path, byte[]> files = new TreeMap<>();
        if (Files.isDirectory(folder)) {
            try (Stream<Path> paths = Files.walk(folder)) {
                for (Path path : paths.filter(Files::isRegularFile).toList()) {
                    files.put(folder.relativize(path), Files.readAllBytes(path));
                }
            }
        }
        return files;
    }

    private static void delete(Path folder) throws IOException {
        if (!Files.exists(folder)) {
            return;
        }
        try (Stream<Path> paths = Files.walk(folder)) {
            for (Path path : paths.sorted((a, b) -> b.compareTo(a)).toList()) {
                Files.delete(path);
            }
        }
    }
}
