package org.modewright.model.edit;

import org.eclipse.emf.common.notify.AdapterFactory;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.edit.provider.ItemProviderAdapter;

/**
 * What all item providers of the structural model share: an object's icon carries the name of its class.
 */
public class StructureItemProvider extends ItemProviderAdapter {

    /**
     * @param adapterFactory the factory that makes this provider
     */
    public StructureItemProvider(AdapterFactory adapterFactory) {
        super(adapterFactory);
    }

    @Override
    public Object getImage(Object object) {
        return getResourceLocator().getImage("full/obj16/" + ((EObject) object).eClass().getName() + ".png");
    }
}
