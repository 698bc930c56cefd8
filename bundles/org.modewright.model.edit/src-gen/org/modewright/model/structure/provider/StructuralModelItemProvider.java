/**
 */
package org.modewright.model.structure.provider;


import java.util.Collection;
import java.util.List;

import org.eclipse.emf.common.notify.AdapterFactory;
import org.eclipse.emf.common.notify.Notification;

import org.eclipse.emf.common.util.ResourceLocator;

import org.eclipse.emf.ecore.EStructuralFeature;

import org.eclipse.emf.edit.provider.ComposeableAdapterFactory;
import org.eclipse.emf.edit.provider.IEditingDomainItemProvider;
import org.eclipse.emf.edit.provider.IItemLabelProvider;
import org.eclipse.emf.edit.provider.IItemPropertyDescriptor;
import org.eclipse.emf.edit.provider.IItemPropertySource;
import org.eclipse.emf.edit.provider.IStructuredItemContentProvider;
import org.eclipse.emf.edit.provider.ITreeItemContentProvider;
import org.eclipse.emf.edit.provider.ItemPropertyDescriptor;
import org.eclipse.emf.edit.provider.ViewerNotification;

import org.modewright.model.edit.StructureItemProvider;

import org.modewright.model.structure.StructuralModel;
import org.modewright.model.structure.StructureFactory;
import org.modewright.model.structure.StructurePackage;

/**
 * This is the item provider adapter for a {@link org.modewright.model.structure.StructuralModel} object.
 * <!-- begin-user-doc -->
 * <!-- end-user-doc -->
 * @generated
 */
public class StructuralModelItemProvider 
	extends StructureItemProvider
	implements
		IEditingDomainItemProvider,
		IStructuredItemContentProvider,
		ITreeItemContentProvider,
		IItemLabelProvider,
		IItemPropertySource {
	/**
	 * This constructs an instance from a factory and a notifier.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public StructuralModelItemProvider(AdapterFactory adapterFactory) {
		super(adapterFactory);
	}

	/**
	 * This returns the property descriptors for the adapted class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public List<IItemPropertyDescriptor> getPropertyDescriptors(Object object) {
		if (itemPropertyDescriptors == null) {
			super.getPropertyDescriptors(object);

			addFormatVersionPropertyDescriptor(object);
			addNamePropertyDescriptor(object);
			addTitlePropertyDescriptor(object);
			addNotesPropertyDescriptor(object);
			addUnitsPropertyDescriptor(object);
			addGravityPropertyDescriptor(object);
			addMassFormulationPropertyDescriptor(object);
			addShearDeformationPropertyDescriptor(object);
			addSelfMassFactorPropertyDescriptor(object);
		}
		return itemPropertyDescriptors;
	}

	/**
	 * This adds a property descriptor for the Format Version feature.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void addFormatVersionPropertyDescriptor(Object object) {
		itemPropertyDescriptors.add
			(createItemPropertyDescriptor
				(((ComposeableAdapterFactory)adapterFactory).getRootAdapterFactory(),
				 getResourceLocator(),
				 getString("_UI_StructuralModel_formatVersion_feature"),
				 getString("_UI_StructuralModel_formatVersion_description"),
				 StructurePackage.Literals.STRUCTURAL_MODEL__FORMAT_VERSION,
				 false,
				 false,
				 false,
				 ItemPropertyDescriptor.INTEGRAL_VALUE_IMAGE,
				 getString("_UI_IdentityPropertyCategory"),
				 null));
	}

	/**
	 * This adds a property descriptor for the Name feature.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void addNamePropertyDescriptor(Object object) {
		itemPropertyDescriptors.add
			(createItemPropertyDescriptor
				(((ComposeableAdapterFactory)adapterFactory).getRootAdapterFactory(),
				 getResourceLocator(),
				 getString("_UI_StructuralModel_name_feature"),
				 getString("_UI_StructuralModel_name_description"),
				 StructurePackage.Literals.STRUCTURAL_MODEL__NAME,
				 true,
				 false,
				 false,
				 ItemPropertyDescriptor.GENERIC_VALUE_IMAGE,
				 getString("_UI_IdentityPropertyCategory"),
				 null));
	}

	/**
	 * This adds a property descriptor for the Title feature.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void addTitlePropertyDescriptor(Object object) {
		itemPropertyDescriptors.add
			(createItemPropertyDescriptor
				(((ComposeableAdapterFactory)adapterFactory).getRootAdapterFactory(),
				 getResourceLocator(),
				 getString("_UI_StructuralModel_title_feature"),
				 getString("_UI_StructuralModel_title_description"),
				 StructurePackage.Literals.STRUCTURAL_MODEL__TITLE,
				 true,
				 false,
				 false,
				 ItemPropertyDescriptor.GENERIC_VALUE_IMAGE,
				 getString("_UI_IdentityPropertyCategory"),
				 null));
	}

	/**
	 * This adds a property descriptor for the Notes feature.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void addNotesPropertyDescriptor(Object object) {
		itemPropertyDescriptors.add
			(createItemPropertyDescriptor
				(((ComposeableAdapterFactory)adapterFactory).getRootAdapterFactory(),
				 getResourceLocator(),
				 getString("_UI_StructuralModel_notes_feature"),
				 getString("_UI_StructuralModel_notes_description"),
				 StructurePackage.Literals.STRUCTURAL_MODEL__NOTES,
				 true,
				 true,
				 false,
				 ItemPropertyDescriptor.GENERIC_VALUE_IMAGE,
				 getString("_UI_IdentityPropertyCategory"),
				 null));
	}

	/**
	 * This adds a property descriptor for the Units feature.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void addUnitsPropertyDescriptor(Object object) {
		itemPropertyDescriptors.add
			(createItemPropertyDescriptor
				(((ComposeableAdapterFactory)adapterFactory).getRootAdapterFactory(),
				 getResourceLocator(),
				 getString("_UI_StructuralModel_units_feature"),
				 getString("_UI_StructuralModel_units_description"),
				 StructurePackage.Literals.STRUCTURAL_MODEL__UNITS,
				 true,
				 false,
				 false,
				 ItemPropertyDescriptor.GENERIC_VALUE_IMAGE,
				 getString("_UI_UnitsPropertyCategory"),
				 null));
	}

	/**
	 * This adds a property descriptor for the Gravity feature.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void addGravityPropertyDescriptor(Object object) {
		itemPropertyDescriptors.add
			(createItemPropertyDescriptor
				(((ComposeableAdapterFactory)adapterFactory).getRootAdapterFactory(),
				 getResourceLocator(),
				 getString("_UI_StructuralModel_gravity_feature"),
				 getString("_UI_StructuralModel_gravity_description"),
				 StructurePackage.Literals.STRUCTURAL_MODEL__GRAVITY,
				 true,
				 false,
				 false,
				 ItemPropertyDescriptor.REAL_VALUE_IMAGE,
				 getString("_UI_UnitsPropertyCategory"),
				 null));
	}

	/**
	 * This adds a property descriptor for the Mass Formulation feature.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void addMassFormulationPropertyDescriptor(Object object) {
		itemPropertyDescriptors.add
			(createItemPropertyDescriptor
				(((ComposeableAdapterFactory)adapterFactory).getRootAdapterFactory(),
				 getResourceLocator(),
				 getString("_UI_StructuralModel_massFormulation_feature"),
				 getString("_UI_StructuralModel_massFormulation_description"),
				 StructurePackage.Literals.STRUCTURAL_MODEL__MASS_FORMULATION,
				 true,
				 false,
				 false,
				 ItemPropertyDescriptor.GENERIC_VALUE_IMAGE,
				 getString("_UI_ComputationPropertyCategory"),
				 null));
	}

	/**
	 * This adds a property descriptor for the Shear Deformation feature.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void addShearDeformationPropertyDescriptor(Object object) {
		itemPropertyDescriptors.add
			(createItemPropertyDescriptor
				(((ComposeableAdapterFactory)adapterFactory).getRootAdapterFactory(),
				 getResourceLocator(),
				 getString("_UI_StructuralModel_shearDeformation_feature"),
				 getString("_UI_StructuralModel_shearDeformation_description"),
				 StructurePackage.Literals.STRUCTURAL_MODEL__SHEAR_DEFORMATION,
				 true,
				 false,
				 false,
				 ItemPropertyDescriptor.BOOLEAN_VALUE_IMAGE,
				 getString("_UI_ComputationPropertyCategory"),
				 null));
	}

	/**
	 * This adds a property descriptor for the Self Mass Factor feature.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void addSelfMassFactorPropertyDescriptor(Object object) {
		itemPropertyDescriptors.add
			(createItemPropertyDescriptor
				(((ComposeableAdapterFactory)adapterFactory).getRootAdapterFactory(),
				 getResourceLocator(),
				 getString("_UI_StructuralModel_selfMassFactor_feature"),
				 getString("_UI_StructuralModel_selfMassFactor_description"),
				 StructurePackage.Literals.STRUCTURAL_MODEL__SELF_MASS_FACTOR,
				 true,
				 false,
				 false,
				 ItemPropertyDescriptor.REAL_VALUE_IMAGE,
				 getString("_UI_ComputationPropertyCategory"),
				 null));
	}

	/**
	 * This specifies how to implement {@link #getChildren} and is used to deduce an appropriate feature for an
	 * {@link org.eclipse.emf.edit.command.AddCommand}, {@link org.eclipse.emf.edit.command.RemoveCommand} or
	 * {@link org.eclipse.emf.edit.command.MoveCommand} in {@link #createCommand}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Collection<? extends EStructuralFeature> getChildrenFeatures(Object object) {
		if (childrenFeatures == null) {
			super.getChildrenFeatures(object);
			childrenFeatures.add(StructurePackage.Literals.STRUCTURAL_MODEL__MATERIALS);
			childrenFeatures.add(StructurePackage.Literals.STRUCTURAL_MODEL__FRAME_SECTIONS);
			childrenFeatures.add(StructurePackage.Literals.STRUCTURAL_MODEL__GROUPS);
			childrenFeatures.add(StructurePackage.Literals.STRUCTURAL_MODEL__LEVELS);
			childrenFeatures.add(StructurePackage.Literals.STRUCTURAL_MODEL__NODES);
			childrenFeatures.add(StructurePackage.Literals.STRUCTURAL_MODEL__MEMBERS);
			childrenFeatures.add(StructurePackage.Literals.STRUCTURAL_MODEL__SPRINGS);
			childrenFeatures.add(StructurePackage.Literals.STRUCTURAL_MODEL__SUPPORTS);
			childrenFeatures.add(StructurePackage.Literals.STRUCTURAL_MODEL__MASSES);
			childrenFeatures.add(StructurePackage.Literals.STRUCTURAL_MODEL__RIGID_FLOORS);
			childrenFeatures.add(StructurePackage.Literals.STRUCTURAL_MODEL__RIGID_LINKS);
			childrenFeatures.add(StructurePackage.Literals.STRUCTURAL_MODEL__TIES);
			childrenFeatures.add(StructurePackage.Literals.STRUCTURAL_MODEL__LOAD_PATTERNS);
			childrenFeatures.add(StructurePackage.Literals.STRUCTURAL_MODEL__ANALYSIS);
			childrenFeatures.add(StructurePackage.Literals.STRUCTURAL_MODEL__AUDIT);
		}
		return childrenFeatures;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected EStructuralFeature getChildFeature(Object object, Object child) {
		// Check the type of the specified child object and return the proper feature to use for
		// adding (see {@link AddCommand}) it as a child.

		return super.getChildFeature(object, child);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected boolean shouldComposeCreationImage() {
		return true;
	}

	/**
	 * This returns the label text for the adapted class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getText(Object object) {
		String label = ((StructuralModel)object).getName();
		return label == null || label.length() == 0 ?
			getString("_UI_StructuralModel_type") :
			getString("_UI_StructuralModel_type") + " " + label;
	}


	/**
	 * This handles model notifications by calling {@link #updateChildren} to update any cached
	 * children and by creating a viewer notification, which it passes to {@link #fireNotifyChanged}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void notifyChanged(Notification notification) {
		updateChildren(notification);

		switch (notification.getFeatureID(StructuralModel.class)) {
			case StructurePackage.STRUCTURAL_MODEL__FORMAT_VERSION:
			case StructurePackage.STRUCTURAL_MODEL__NAME:
			case StructurePackage.STRUCTURAL_MODEL__TITLE:
			case StructurePackage.STRUCTURAL_MODEL__NOTES:
			case StructurePackage.STRUCTURAL_MODEL__UNITS:
			case StructurePackage.STRUCTURAL_MODEL__GRAVITY:
			case StructurePackage.STRUCTURAL_MODEL__MASS_FORMULATION:
			case StructurePackage.STRUCTURAL_MODEL__SHEAR_DEFORMATION:
			case StructurePackage.STRUCTURAL_MODEL__SELF_MASS_FACTOR:
				fireNotifyChanged(new ViewerNotification(notification, notification.getNotifier(), false, true));
				return;
			case StructurePackage.STRUCTURAL_MODEL__MATERIALS:
			case StructurePackage.STRUCTURAL_MODEL__FRAME_SECTIONS:
			case StructurePackage.STRUCTURAL_MODEL__GROUPS:
			case StructurePackage.STRUCTURAL_MODEL__LEVELS:
			case StructurePackage.STRUCTURAL_MODEL__NODES:
			case StructurePackage.STRUCTURAL_MODEL__MEMBERS:
			case StructurePackage.STRUCTURAL_MODEL__SPRINGS:
			case StructurePackage.STRUCTURAL_MODEL__SUPPORTS:
			case StructurePackage.STRUCTURAL_MODEL__MASSES:
			case StructurePackage.STRUCTURAL_MODEL__RIGID_FLOORS:
			case StructurePackage.STRUCTURAL_MODEL__RIGID_LINKS:
			case StructurePackage.STRUCTURAL_MODEL__TIES:
			case StructurePackage.STRUCTURAL_MODEL__LOAD_PATTERNS:
			case StructurePackage.STRUCTURAL_MODEL__ANALYSIS:
			case StructurePackage.STRUCTURAL_MODEL__AUDIT:
				fireNotifyChanged(new ViewerNotification(notification, notification.getNotifier(), true, false));
				return;
		}
		super.notifyChanged(notification);
	}

	/**
	 * This adds {@link org.eclipse.emf.edit.command.CommandParameter}s describing the children
	 * that can be created under this object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected void collectNewChildDescriptors(Collection<Object> newChildDescriptors, Object object) {
		super.collectNewChildDescriptors(newChildDescriptors, object);

		newChildDescriptors.add
			(createChildParameter
				(StructurePackage.Literals.STRUCTURAL_MODEL__MATERIALS,
				 StructureFactory.eINSTANCE.createMaterial()));

		newChildDescriptors.add
			(createChildParameter
				(StructurePackage.Literals.STRUCTURAL_MODEL__FRAME_SECTIONS,
				 StructureFactory.eINSTANCE.createFrameSection()));

		newChildDescriptors.add
			(createChildParameter
				(StructurePackage.Literals.STRUCTURAL_MODEL__GROUPS,
				 StructureFactory.eINSTANCE.createGroup()));

		newChildDescriptors.add
			(createChildParameter
				(StructurePackage.Literals.STRUCTURAL_MODEL__LEVELS,
				 StructureFactory.eINSTANCE.createLevel()));

		newChildDescriptors.add
			(createChildParameter
				(StructurePackage.Literals.STRUCTURAL_MODEL__NODES,
				 StructureFactory.eINSTANCE.createNode()));

		newChildDescriptors.add
			(createChildParameter
				(StructurePackage.Literals.STRUCTURAL_MODEL__MEMBERS,
				 StructureFactory.eINSTANCE.createMember()));

		newChildDescriptors.add
			(createChildParameter
				(StructurePackage.Literals.STRUCTURAL_MODEL__SPRINGS,
				 StructureFactory.eINSTANCE.createSpring()));

		newChildDescriptors.add
			(createChildParameter
				(StructurePackage.Literals.STRUCTURAL_MODEL__SUPPORTS,
				 StructureFactory.eINSTANCE.createSupport()));

		newChildDescriptors.add
			(createChildParameter
				(StructurePackage.Literals.STRUCTURAL_MODEL__MASSES,
				 StructureFactory.eINSTANCE.createNodalMass()));

		newChildDescriptors.add
			(createChildParameter
				(StructurePackage.Literals.STRUCTURAL_MODEL__RIGID_FLOORS,
				 StructureFactory.eINSTANCE.createRigidFloor()));

		newChildDescriptors.add
			(createChildParameter
				(StructurePackage.Literals.STRUCTURAL_MODEL__RIGID_LINKS,
				 StructureFactory.eINSTANCE.createRigidLink()));

		newChildDescriptors.add
			(createChildParameter
				(StructurePackage.Literals.STRUCTURAL_MODEL__TIES,
				 StructureFactory.eINSTANCE.createMultiPointTie()));

		newChildDescriptors.add
			(createChildParameter
				(StructurePackage.Literals.STRUCTURAL_MODEL__LOAD_PATTERNS,
				 StructureFactory.eINSTANCE.createLoadPattern()));

		newChildDescriptors.add
			(createChildParameter
				(StructurePackage.Literals.STRUCTURAL_MODEL__ANALYSIS,
				 StructureFactory.eINSTANCE.createAnalysisSettings()));

		newChildDescriptors.add
			(createChildParameter
				(StructurePackage.Literals.STRUCTURAL_MODEL__AUDIT,
				 StructureFactory.eINSTANCE.createAuditSettings()));
	}

	/**
	 * Return the resource locator for this item provider's resources.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public ResourceLocator getResourceLocator() {
		return StructureEditPlugin.INSTANCE;
	}

}
