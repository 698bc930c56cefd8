package org.modewright.model.edit;

import java.util.Collection;
import java.util.Collections;
import java.util.List;

import org.eclipse.emf.common.command.Command;
import org.eclipse.emf.common.notify.AdapterFactory;
import org.eclipse.emf.common.util.ResourceLocator;
import org.eclipse.emf.ecore.EReference;
import org.eclipse.emf.edit.command.CommandParameter;
import org.eclipse.emf.edit.domain.EditingDomain;
import org.eclipse.emf.edit.provider.IEditingDomainItemProvider;
import org.eclipse.emf.edit.provider.IItemLabelProvider;
import org.eclipse.emf.edit.provider.IItemPropertyDescriptor;
import org.eclipse.emf.edit.provider.IItemPropertySource;
import org.eclipse.emf.edit.provider.ITreeItemContentProvider;
import org.eclipse.emf.edit.provider.ItemProviderAdapter;
import org.modewright.model.structure.StructuralModel;
import org.modewright.model.structure.provider.StructureEditPlugin;

/**
 * A tree node that stands for one list of a model, such as "Nodes (120)". It is its own item provider, shows the list itself without
 * copying it, and cannot be edited.
 */
public final class CategoryItemProvider extends ItemProviderAdapter implements IEditingDomainItemProvider, ITreeItemContentProvider,
        IItemLabelProvider, IItemPropertySource {

    private final ItemProviderAdapter owner;
    private final StructuralModel model;
    private final EReference list;

    CategoryItemProvider(AdapterFactory adapterFactory, ItemProviderAdapter owner, StructuralModel model, EReference list) {
        super(adapterFactory);
        this.owner = owner;
        this.model = model;
        this.list = list;
    }

    /**
     * @return the model whose list this is
     */
    public StructuralModel model() {
        return model;
    }

    /**
     * @return the containment list that this category stands for
     */
    public EReference feature() {
        return list;
    }

    /**
     * @return the objects of the list, live and unmodifiable
     */
    public List<?> objects() {
        return Collections.unmodifiableList((List<?>) model.eGet(list));
    }

    @Override
    public Collection<?> getElements(Object object) {
        return objects();
    }

    @Override
    public Collection<?> getChildren(Object object) {
        return objects();
    }

    @Override
    public boolean hasChildren(Object object) {
        return !objects().isEmpty();
    }

    @Override
    public Object getParent(Object object) {
        return model;
    }

    @Override
    public String getText(Object object) {
        return getString("_UI_Label_category", new Object[] {getString("_UI_StructuralModel_" + list.getName() + "_feature"),
            objects().size()});
    }

    @Override
    public Object getImage(Object object) {
        return getResourceLocator().getImage(StructureItemProvider.icon(list.getEReferenceType().getName()));
    }

    @Override
    public List<IItemPropertyDescriptor> getPropertyDescriptors(Object object) {
        return List.of();
    }

    @Override
    public Collection<?> getNewChildDescriptors(Object object, EditingDomain domain, Object sibling) {
        return owner.getNewChildDescriptors(model, domain, null).stream()
                .filter(d -> d instanceof CommandParameter parameter && parameter.getFeature() == list).toList();
    }

    @Override
    public Command createCommand(Object object, EditingDomain domain, Class<? extends Command> commandClass, CommandParameter parameter) {
        parameter.setOwner(model);
        return owner.createCommand(model, domain, commandClass, parameter);
    }

    @Override
    public ResourceLocator getResourceLocator() {
        return StructureEditPlugin.INSTANCE;
    }
}
