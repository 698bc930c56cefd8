package org.modewright.model.edit;

import org.eclipse.emf.common.notify.AdapterFactory;
import org.eclipse.emf.common.util.ResourceLocator;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EStructuralFeature;
import org.eclipse.emf.edit.provider.IItemLabelProvider;
import org.eclipse.emf.edit.provider.ItemPropertyDescriptor;
import org.eclipse.emf.edit.provider.ItemProviderAdapter;
import org.modewright.model.structure.StructuralModel;

/**
 * What all item providers of the structural model share: an object's icon carries the name of its class, its parent in a tree is the
 * category of its kind, and property sheets call referred objects by their names alone.
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
        return getResourceLocator().getImage(icon(((EObject) object).eClass().getName()));
    }

    static String icon(String name) {
        return "full/obj16/" + name + ".png";
    }

    @Override
    public Object getParent(Object object) {
        Object parent = super.getParent(object);
        if (parent instanceof StructuralModel model && adapterFactory instanceof StructureEditAdapterFactory factory) {
            CategoryItemProvider category = factory.category(model, ((EObject) object).eContainmentFeature());
            return category == null ? parent : category;
        }
        return parent;
    }

    @Override
    protected ItemPropertyDescriptor createItemPropertyDescriptor(AdapterFactory factory, ResourceLocator locator, String displayName,
            String description, EStructuralFeature feature, boolean isSettable, boolean multiLine, boolean sortChoices, Object staticImage,
            String category, String[] filterFlags) {
        return new ItemPropertyDescriptor(factory, locator, displayName, description, feature, isSettable, multiLine, sortChoices,
                staticImage, category, filterFlags) {
            @Override
            public IItemLabelProvider getLabelProvider(Object object) {
                return new ValueLabels(super.getLabelProvider(object));
            }
        };
    }

    /** Names of referred objects, whatever else as it is. */
    private static final class ValueLabels implements IItemLabelProvider {

        private final IItemLabelProvider others;

        ValueLabels(IItemLabelProvider others) {
            this.others = others;
        }

        @Override
        public String getText(Object value) {
            String name = Labels.name(value);
            return name == null ? others.getText(value) : name;
        }

        @Override
        public Object getImage(Object value) {
            return others.getImage(value);
        }
    }
}
