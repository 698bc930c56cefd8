/**
 */
package org.modewright.model.structure.provider;


import java.util.Collection;
import java.util.List;

import org.eclipse.emf.common.notify.AdapterFactory;
import org.eclipse.emf.common.notify.Notification;

import org.eclipse.emf.edit.provider.ComposeableAdapterFactory;
import org.eclipse.emf.edit.provider.IItemPropertyDescriptor;
import org.eclipse.emf.edit.provider.ItemPropertyDescriptor;
import org.eclipse.emf.edit.provider.ViewerNotification;

import org.modewright.model.structure.StructurePackage;
import org.modewright.model.structure.Support;

/**
 * This is the item provider adapter for a {@link org.modewright.model.structure.Support} object.
 * <!-- begin-user-doc -->
 * <!-- end-user-doc -->
 * @generated
 */
public class SupportItemProvider extends IdentifiedItemProvider {
	/**
	 * This constructs an instance from a factory and a notifier.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public SupportItemProvider(AdapterFactory adapterFactory) {
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

			addNodePropertyDescriptor(object);
			addUxPropertyDescriptor(object);
			addUyPropertyDescriptor(object);
			addUzPropertyDescriptor(object);
			addRxPropertyDescriptor(object);
			addRyPropertyDescriptor(object);
			addRzPropertyDescriptor(object);
			addElasticUxPropertyDescriptor(object);
			addElasticUyPropertyDescriptor(object);
			addElasticUzPropertyDescriptor(object);
			addElasticRxPropertyDescriptor(object);
			addElasticRyPropertyDescriptor(object);
			addElasticRzPropertyDescriptor(object);
		}
		return itemPropertyDescriptors;
	}

	/**
	 * This adds a property descriptor for the Node feature.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void addNodePropertyDescriptor(Object object) {
		itemPropertyDescriptors.add
			(createItemPropertyDescriptor
				(((ComposeableAdapterFactory)adapterFactory).getRootAdapterFactory(),
				 getResourceLocator(),
				 getString("_UI_Support_node_feature"),
				 getString("_UI_Support_node_description"),
				 StructurePackage.Literals.SUPPORT__NODE,
				 true,
				 false,
				 true,
				 null,
				 getString("_UI_PropertiesPropertyCategory"),
				 null));
	}

	/**
	 * This adds a property descriptor for the Ux feature.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void addUxPropertyDescriptor(Object object) {
		itemPropertyDescriptors.add
			(createItemPropertyDescriptor
				(((ComposeableAdapterFactory)adapterFactory).getRootAdapterFactory(),
				 getResourceLocator(),
				 getString("_UI_Support_ux_feature"),
				 getString("_UI_Support_ux_description"),
				 StructurePackage.Literals.SUPPORT__UX,
				 true,
				 false,
				 false,
				 ItemPropertyDescriptor.BOOLEAN_VALUE_IMAGE,
				 getString("_UI_HeldcomponentsPropertyCategory"),
				 null));
	}

	/**
	 * This adds a property descriptor for the Uy feature.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void addUyPropertyDescriptor(Object object) {
		itemPropertyDescriptors.add
			(createItemPropertyDescriptor
				(((ComposeableAdapterFactory)adapterFactory).getRootAdapterFactory(),
				 getResourceLocator(),
				 getString("_UI_Support_uy_feature"),
				 getString("_UI_Support_uy_description"),
				 StructurePackage.Literals.SUPPORT__UY,
				 true,
				 false,
				 false,
				 ItemPropertyDescriptor.BOOLEAN_VALUE_IMAGE,
				 getString("_UI_HeldcomponentsPropertyCategory"),
				 null));
	}

	/**
	 * This adds a property descriptor for the Uz feature.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void addUzPropertyDescriptor(Object object) {
		itemPropertyDescriptors.add
			(createItemPropertyDescriptor
				(((ComposeableAdapterFactory)adapterFactory).getRootAdapterFactory(),
				 getResourceLocator(),
				 getString("_UI_Support_uz_feature"),
				 getString("_UI_Support_uz_description"),
				 StructurePackage.Literals.SUPPORT__UZ,
				 true,
				 false,
				 false,
				 ItemPropertyDescriptor.BOOLEAN_VALUE_IMAGE,
				 getString("_UI_HeldcomponentsPropertyCategory"),
				 null));
	}

	/**
	 * This adds a property descriptor for the Rx feature.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void addRxPropertyDescriptor(Object object) {
		itemPropertyDescriptors.add
			(createItemPropertyDescriptor
				(((ComposeableAdapterFactory)adapterFactory).getRootAdapterFactory(),
				 getResourceLocator(),
				 getString("_UI_Support_rx_feature"),
				 getString("_UI_Support_rx_description"),
				 StructurePackage.Literals.SUPPORT__RX,
				 true,
				 false,
				 false,
				 ItemPropertyDescriptor.BOOLEAN_VALUE_IMAGE,
				 getString("_UI_HeldcomponentsPropertyCategory"),
				 null));
	}

	/**
	 * This adds a property descriptor for the Ry feature.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void addRyPropertyDescriptor(Object object) {
		itemPropertyDescriptors.add
			(createItemPropertyDescriptor
				(((ComposeableAdapterFactory)adapterFactory).getRootAdapterFactory(),
				 getResourceLocator(),
				 getString("_UI_Support_ry_feature"),
				 getString("_UI_Support_ry_description"),
				 StructurePackage.Literals.SUPPORT__RY,
				 true,
				 false,
				 false,
				 ItemPropertyDescriptor.BOOLEAN_VALUE_IMAGE,
				 getString("_UI_HeldcomponentsPropertyCategory"),
				 null));
	}

	/**
	 * This adds a property descriptor for the Rz feature.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void addRzPropertyDescriptor(Object object) {
		itemPropertyDescriptors.add
			(createItemPropertyDescriptor
				(((ComposeableAdapterFactory)adapterFactory).getRootAdapterFactory(),
				 getResourceLocator(),
				 getString("_UI_Support_rz_feature"),
				 getString("_UI_Support_rz_description"),
				 StructurePackage.Literals.SUPPORT__RZ,
				 true,
				 false,
				 false,
				 ItemPropertyDescriptor.BOOLEAN_VALUE_IMAGE,
				 getString("_UI_HeldcomponentsPropertyCategory"),
				 null));
	}

	/**
	 * This adds a property descriptor for the Elastic Ux feature.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void addElasticUxPropertyDescriptor(Object object) {
		itemPropertyDescriptors.add
			(createItemPropertyDescriptor
				(((ComposeableAdapterFactory)adapterFactory).getRootAdapterFactory(),
				 getResourceLocator(),
				 getString("_UI_Support_elasticUx_feature"),
				 getString("_UI_Support_elasticUx_description"),
				 StructurePackage.Literals.SUPPORT__ELASTIC_UX,
				 true,
				 false,
				 false,
				 ItemPropertyDescriptor.REAL_VALUE_IMAGE,
				 getString("_UI_ElasticstiffnessPropertyCategory"),
				 null));
	}

	/**
	 * This adds a property descriptor for the Elastic Uy feature.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void addElasticUyPropertyDescriptor(Object object) {
		itemPropertyDescriptors.add
			(createItemPropertyDescriptor
				(((ComposeableAdapterFactory)adapterFactory).getRootAdapterFactory(),
				 getResourceLocator(),
				 getString("_UI_Support_elasticUy_feature"),
				 getString("_UI_Support_elasticUy_description"),
				 StructurePackage.Literals.SUPPORT__ELASTIC_UY,
				 true,
				 false,
				 false,
				 ItemPropertyDescriptor.REAL_VALUE_IMAGE,
				 getString("_UI_ElasticstiffnessPropertyCategory"),
				 null));
	}

	/**
	 * This adds a property descriptor for the Elastic Uz feature.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void addElasticUzPropertyDescriptor(Object object) {
		itemPropertyDescriptors.add
			(createItemPropertyDescriptor
				(((ComposeableAdapterFactory)adapterFactory).getRootAdapterFactory(),
				 getResourceLocator(),
				 getString("_UI_Support_elasticUz_feature"),
				 getString("_UI_Support_elasticUz_description"),
				 StructurePackage.Literals.SUPPORT__ELASTIC_UZ,
				 true,
				 false,
				 false,
				 ItemPropertyDescriptor.REAL_VALUE_IMAGE,
				 getString("_UI_ElasticstiffnessPropertyCategory"),
				 null));
	}

	/**
	 * This adds a property descriptor for the Elastic Rx feature.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void addElasticRxPropertyDescriptor(Object object) {
		itemPropertyDescriptors.add
			(createItemPropertyDescriptor
				(((ComposeableAdapterFactory)adapterFactory).getRootAdapterFactory(),
				 getResourceLocator(),
				 getString("_UI_Support_elasticRx_feature"),
				 getString("_UI_Support_elasticRx_description"),
				 StructurePackage.Literals.SUPPORT__ELASTIC_RX,
				 true,
				 false,
				 false,
				 ItemPropertyDescriptor.REAL_VALUE_IMAGE,
				 getString("_UI_ElasticstiffnessPropertyCategory"),
				 null));
	}

	/**
	 * This adds a property descriptor for the Elastic Ry feature.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void addElasticRyPropertyDescriptor(Object object) {
		itemPropertyDescriptors.add
			(createItemPropertyDescriptor
				(((ComposeableAdapterFactory)adapterFactory).getRootAdapterFactory(),
				 getResourceLocator(),
				 getString("_UI_Support_elasticRy_feature"),
				 getString("_UI_Support_elasticRy_description"),
				 StructurePackage.Literals.SUPPORT__ELASTIC_RY,
				 true,
				 false,
				 false,
				 ItemPropertyDescriptor.REAL_VALUE_IMAGE,
				 getString("_UI_ElasticstiffnessPropertyCategory"),
				 null));
	}

	/**
	 * This adds a property descriptor for the Elastic Rz feature.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void addElasticRzPropertyDescriptor(Object object) {
		itemPropertyDescriptors.add
			(createItemPropertyDescriptor
				(((ComposeableAdapterFactory)adapterFactory).getRootAdapterFactory(),
				 getResourceLocator(),
				 getString("_UI_Support_elasticRz_feature"),
				 getString("_UI_Support_elasticRz_description"),
				 StructurePackage.Literals.SUPPORT__ELASTIC_RZ,
				 true,
				 false,
				 false,
				 ItemPropertyDescriptor.REAL_VALUE_IMAGE,
				 getString("_UI_ElasticstiffnessPropertyCategory"),
				 null));
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
		String label = ((Support)object).getName();
		return label == null || label.length() == 0 ?
			getString("_UI_Support_type") :
			getString("_UI_Support_type") + " " + label;
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

		switch (notification.getFeatureID(Support.class)) {
			case StructurePackage.SUPPORT__NODE:
			case StructurePackage.SUPPORT__UX:
			case StructurePackage.SUPPORT__UY:
			case StructurePackage.SUPPORT__UZ:
			case StructurePackage.SUPPORT__RX:
			case StructurePackage.SUPPORT__RY:
			case StructurePackage.SUPPORT__RZ:
			case StructurePackage.SUPPORT__ELASTIC_UX:
			case StructurePackage.SUPPORT__ELASTIC_UY:
			case StructurePackage.SUPPORT__ELASTIC_UZ:
			case StructurePackage.SUPPORT__ELASTIC_RX:
			case StructurePackage.SUPPORT__ELASTIC_RY:
			case StructurePackage.SUPPORT__ELASTIC_RZ:
				fireNotifyChanged(new ViewerNotification(notification, notification.getNotifier(), false, true));
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
	}

}
