package org.modewright.model.edit;

import java.util.ArrayList;
import java.util.List;

import org.eclipse.emf.common.notify.Adapter;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EStructuralFeature;
import org.eclipse.emf.edit.provider.IItemLabelProvider;
import org.eclipse.emf.edit.provider.ITreeItemContentProvider;
import org.modewright.model.structure.Member;
import org.modewright.model.structure.StructuralModel;
import org.modewright.model.structure.provider.StructureEditPlugin;
import org.modewright.model.structure.provider.StructureItemProviderAdapterFactory;

/**
 * The item providers of the structural model as the workbench shows them: labels of {@link Labels}, and the parts of a model under one
 * category a kind.
 */
public final class StructureEditAdapterFactory extends StructureItemProviderAdapterFactory {

    private final List<CategorisedModelItemProvider> models = new ArrayList<>();
    private final IItemLabelProvider labels = new ObjectLabels();

    /** Categories belong to one model, so each model has a provider of its own. */
    @Override
    public Adapter createStructuralModelAdapter() {
        CategorisedModelItemProvider provider = new CategorisedModelItemProvider(this);
        models.add(provider);
        return provider;
    }

    @Override
    public Object adapt(Object object, Object type) {
        Object adapter = super.adapt(object, type);
        return type == IItemLabelProvider.class && adapter != null && object instanceof EObject ? labels : adapter;
    }

    /**
     * @param model   a model
     * @param feature one of its containment lists
     * @return the category that stands for the list, or null if it has none
     */
    public CategoryItemProvider category(StructuralModel model, EStructuralFeature feature) {
        return adapt(model, (Object) ITreeItemContentProvider.class) instanceof CategorisedModelItemProvider provider
                ? provider.category(feature) : null;
    }

    @Override
    public void dispose() {
        super.dispose();
        models.forEach(CategorisedModelItemProvider::dispose);
        models.clear();
    }

    private final class ObjectLabels implements IItemLabelProvider {

        @Override
        public String getText(Object object) {
            return Labels.of(object);
        }

        @Override
        public Object getImage(Object object) {
            if (object instanceof Member member && member.isAxialOnly()) {
                return StructureEditPlugin.INSTANCE.getImage(StructureItemProvider.icon("Bar"));
            }
            Object provider = StructureEditAdapterFactory.super.adapt(object, IItemLabelProvider.class);
            return provider instanceof IItemLabelProvider images ? images.getImage(object) : null;
        }
    }
}
