package org.modewright.model;

import org.eclipse.emf.common.util.URI;
import org.eclipse.emf.ecore.resource.Resource;

/**
 * Makes the resources of model files; register it for the extension {@value ModelFile#EXTENSION} in a resource set.
 */
public final class StructureResourceFactory implements Resource.Factory {

    @Override
    public Resource createResource(URI uri) {
        return new StructureResource(uri);
    }
}
