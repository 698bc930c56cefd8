package org.modewright.model.edit;

import java.util.ArrayList;
import java.util.Collection;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.stream.Stream;

import org.eclipse.emf.common.notify.AdapterFactory;
import org.eclipse.emf.common.notify.Notification;
import org.eclipse.emf.common.notify.Notifier;
import org.eclipse.emf.ecore.EReference;
import org.eclipse.emf.ecore.EStructuralFeature;
import org.eclipse.emf.edit.provider.ViewerNotification;
import org.modewright.model.structure.StructuralModel;
import org.modewright.model.structure.StructurePackage;
import org.modewright.model.structure.provider.StructuralModelItemProvider;

/** Shows the parts of a model under one category a kind, then the settings. */
final class CategorisedModelItemProvider extends StructuralModelItemProvider {

    private final Map<EStructuralFeature, CategoryItemProvider> categories = new LinkedHashMap<>();

    CategorisedModelItemProvider(AdapterFactory adapterFactory) {
        super(adapterFactory);
    }

    @Override
    public void setTarget(Notifier target) {
        super.setTarget(target);
        categories.clear();
        if (target instanceof StructuralModel model) {
            for (EReference list : StructurePackage.Literals.STRUCTURAL_MODEL.getEAllContainments()) {
                if (list.isMany()) {
                    categories.put(list, new CategoryItemProvider(adapterFactory, this, model, list));
                }
            }
        }
    }

    CategoryItemProvider category(EStructuralFeature feature) {
        return categories.get(feature);
    }

    @Override
    public Collection<?> getChildren(Object object) {
        StructuralModel model = (StructuralModel) object;
        List<Object> children = new ArrayList<>(categories.values());
        Stream.of(model.getAnalysis(), model.getAudit()).filter(Objects::nonNull).forEach(children::add);
        return children;
    }

    @Override
    public boolean hasChildren(Object object) {
        return true;
    }

    @Override
    public void notifyChanged(Notification notification) {
        CategoryItemProvider category = notification.getFeature() instanceof EStructuralFeature feature ? category(feature) : null;
        if (category == null) {
            super.notifyChanged(notification);
        } else {
            fireNotifyChanged(new ViewerNotification(notification, category, true, true));
        }
    }
}
