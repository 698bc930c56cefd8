package org.modewright.model;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.Path;

import org.eclipse.emf.common.util.URI;
import org.eclipse.emf.ecore.resource.Resource;
import org.eclipse.emf.ecore.util.EcoreUtil;
import org.modewright.model.structure.StructuralModel;
import org.modewright.model.structure.StructureFactory;

/**
 * Reads and writes structural models: XMI in UTF-8, one object a line, defaults left out, references by id, no time stamps, so that
 * equal models give equal bytes and files diff well.
 */
public final class ModelFile {

    /** Extension of model files, without the dot. */
    public static final String EXTENSION = "modewright";

    /** Version of the file format that is written, and the newest that is read. */
    public static final int FORMAT_VERSION = 1;

    private ModelFile() {
    }

    /**
     * @param name name of the new model
     * @return an empty model with analysis and audit settings
     */
    public static StructuralModel create(String name) {
        StructuralModel model = StructureFactory.eINSTANCE.createStructuralModel();
        model.setName(name);
        model.setAnalysis(StructureFactory.eINSTANCE.createAnalysisSettings());
        model.setAudit(StructureFactory.eINSTANCE.createAuditSettings());
        return model;
    }

    /**
     * @param file a model file
     * @return the model, held by a {@link StructureResource} of its own
     * @throws ModelFileException if the file cannot be read, is broken, unsafe or newer than this program
     */
    public static StructuralModel load(Path file) throws ModelFileException {
        byte[] bytes;
        try {
            bytes = Files.readAllBytes(file);
        } catch (IOException e) {
            throw new ModelFileException(file.toString(), 0, 0, "The file cannot be read (" + AtomicFile.reason(e) + ").",
                    "Check its path and your access rights.", e);
        }
        return load(new ByteArrayInputStream(bytes), URI.createFileURI(file.toAbsolutePath().toString()), file.toString());
    }

    /**
     * @param in   the text of a model file; not closed
     * @param name name of the source in messages
     * @return the model, held by a {@link StructureResource} of its own
     * @throws ModelFileException if the text cannot be read, is broken, unsafe or newer than this program
     */
    public static StructuralModel load(InputStream in, String name) throws ModelFileException {
        return load(in, URI.createURI("model." + EXTENSION), name);
    }

    private static StructuralModel load(InputStream in, URI uri, String name) throws ModelFileException {
        StructureResource resource = new StructureResource(uri, name);
        try {
            resource.load(in, null);
        } catch (ModelFileException e) {
            throw e;
        } catch (IOException e) {
            throw new ModelFileException(name, 0, 0, "The model cannot be read (" + AtomicFile.reason(e) + ").", "Try again.", e);
        }
        return (StructuralModel) resource.getContents().get(0);
    }

    /**
     * Writes a model. A crash at any moment leaves the old file or the new one. Objects without an id get one.
     *
     * @param model the model
     * @param file  where to; its folder must exist
     * @throws ModelFileException if the model cannot be written; an existing file then stays as it was
     */
    public static void save(StructuralModel model, Path file) throws ModelFileException {
        Ids.assignMissing(model);
        AtomicFile.write(file, bytes(model, file.toString()));
    }

    /**
     * @param model a model whose objects all have ids
     * @return what {@link #save} writes for it
     * @throws ModelFileException if the model holds something that a file cannot hold
     */
    public static byte[] bytes(StructuralModel model) throws ModelFileException {
        String name = model.getName();
        return bytes(model, name == null || name.isBlank() ? "model" : name);
    }

    private static byte[] bytes(StructuralModel model, String name) throws ModelFileException {
        Resource resource = model.eResource();
        if (resource instanceof StructureResource own) {
            return own.bytes(name);
        }
        StructureResource scratch = new StructureResource(URI.createURI("model." + EXTENSION), name);
        scratch.getContents().add(EcoreUtil.copy(model));
        return scratch.bytes(name);
    }
}
