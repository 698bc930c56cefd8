package org.modewright.model;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.InputStream;
import java.io.OutputStream;
import java.nio.file.Path;
import java.util.HashMap;
import java.util.Map;

import org.eclipse.emf.common.util.URI;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.resource.Resource;
import org.eclipse.emf.ecore.xmi.XMLLoad;
import org.eclipse.emf.ecore.xmi.XMLResource;
import org.eclipse.emf.ecore.xmi.XMLSave;
import org.eclipse.emf.ecore.xmi.impl.XMIResourceImpl;
import org.modewright.model.structure.StructuralModel;

/**
 * The resource of a model file, for editing domains: reads and writes exactly as {@link ModelFile} does. Saving to a {@code file:}
 * address replaces the file as a whole.
 */
public class StructureResource extends XMIResourceImpl {

    private final String label;
    private SourceText source = new SourceText(new byte[0]);

    /**
     * @param uri address of the model file
     */
    public StructureResource(URI uri) {
        this(uri, uri.isFile() ? uri.toFileString() : uri.toString());
    }

    StructureResource(URI uri, String label) {
        super(uri);
        this.label = label;
        setEncoding("UTF-8");
        setIntrinsicIDToEObjectMap(new HashMap<>());
    }

    /** References go by the id attribute alone. */
    @Override
    protected boolean useUUIDs() {
        return false;
    }

    @Override
    public void setID(EObject object, String id) {
        return;
    }

    @Override
    protected XMLLoad createXMLLoad() {
        return new StructureLoad(createXMLHelper());
    }

    @Override
    protected XMLSave createXMLSave() {
        return new StructureSave(createXMLHelper());
    }

    @Override
    public void doLoad(InputStream in, Map<?, ?> options) throws IOException {
        byte[] bytes = in.readAllBytes();
        source = new SourceText(bytes);
        try {
            super.doLoad(new ByteArrayInputStream(bytes), loadOptions());
        } catch (LoadFault fault) {
            throw refused(fault);
        } catch (Resource.IOWrappedException e) {
            throw refused(LoadFault.of(e.getCause() == null ? e : e.getCause()));
        } catch (IOException e) {
            throw refused(LoadFault.of(e));
        } finally {
            source = new SourceText(new byte[0]);
        }
    }

    private ModelFileException refused(LoadFault fault) {
        getContents().clear();
        getErrors().clear();
        SourceText.Place place = source.locate(fault.line(), fault.column(), fault.words());
        return new ModelFileException(label, place.line(), place.column(), fault.reason(), fault.remedy(), fault.getCause());
    }

    @Override
    public void save(Map<?, ?> options) throws IOException {
        Ids.assignMissing(model());
        byte[] bytes = bytes(label);
        if (getURI().isFile()) {
            AtomicFile.write(Path.of(getURI().toFileString()), bytes);
        } else {
            try (OutputStream out = getURIConverter().createOutputStream(getURI(), options)) {
                out.write(bytes);
            }
        }
        setTimeStamp(System.currentTimeMillis());
        setModified(false);
    }

    /** @return what is written, complete, before any file is touched */
    byte[] bytes(String name) throws ModelFileException {
        Storable.check(model(), name);
        ByteArrayOutputStream out = new ByteArrayOutputStream(1 << 16);
        try {
            doSave(out, saveOptions());
        } catch (IOException e) {
            throw new ModelFileException(name, 0, 0, "The model cannot be written (" + AtomicFile.reason(e) + ").",
                    "Check the model for references to deleted objects.", e);
        }
        return out.toByteArray();
    }

    private StructuralModel model() throws ModelFileException {
        if (getContents().size() == 1 && getContents().get(0) instanceof StructuralModel model) {
            return model;
        }
        throw new ModelFileException(label, 0, 0, "A model file holds exactly one structural model.", "Put one in.", null);
    }

    private static Map<Object, Object> loadOptions() {
        Map<Object, Object> options = new HashMap<>();
        options.put(XMLResource.OPTION_DEFER_ATTACHMENT, Boolean.TRUE);
        options.put(XMLResource.OPTION_DEFER_IDREF_RESOLUTION, Boolean.TRUE);
        return options;
    }

    private static Map<Object, Object> saveOptions() {
        Map<Object, Object> options = new HashMap<>();
        options.put(XMLResource.OPTION_ENCODING, "UTF-8");
        options.put(Resource.OPTION_LINE_DELIMITER, "\n");
        return options;
    }
}
