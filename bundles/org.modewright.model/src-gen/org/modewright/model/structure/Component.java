/**
 */
package org.modewright.model.structure;

import java.util.Arrays;
import java.util.Collections;
import java.util.List;

import org.eclipse.emf.common.util.Enumerator;

/**
 * <!-- begin-user-doc -->
 * A representation of the literals of the enumeration '<em><b>Component</b></em>',
 * and utility methods for working with them.
 * <!-- end-user-doc -->
 * <!-- begin-model-doc -->
 * One of the six components of motion of a node: translations and rotations.
 * <!-- end-model-doc -->
 * @see org.modewright.model.structure.StructurePackage#getComponent()
 * @generated
 */
public enum Component implements Enumerator {
	/**
	 * The '<em><b>UX</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #UX_VALUE
	 * @generated
	 * @ordered
	 */
	UX(0, "UX", "ux"),

	/**
	 * The '<em><b>UY</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #UY_VALUE
	 * @generated
	 * @ordered
	 */
	UY(1, "UY", "uy"),

	/**
	 * The '<em><b>UZ</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #UZ_VALUE
	 * @generated
	 * @ordered
	 */
	UZ(2, "UZ", "uz"),

	/**
	 * The '<em><b>RX</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #RX_VALUE
	 * @generated
	 * @ordered
	 */
	RX(3, "RX", "rx"),

	/**
	 * The '<em><b>RY</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #RY_VALUE
	 * @generated
	 * @ordered
	 */
	RY(4, "RY", "ry"),

	/**
	 * The '<em><b>RZ</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #RZ_VALUE
	 * @generated
	 * @ordered
	 */
	RZ(5, "RZ", "rz");

	/**
	 * The '<em><b>UX</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #UX
	 * @generated
	 * @ordered
	 */
	public static final int UX_VALUE = 0;

	/**
	 * The '<em><b>UY</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #UY
	 * @generated
	 * @ordered
	 */
	public static final int UY_VALUE = 1;

	/**
	 * The '<em><b>UZ</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #UZ
	 * @generated
	 * @ordered
	 */
	public static final int UZ_VALUE = 2;

	/**
	 * The '<em><b>RX</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #RX
	 * @generated
	 * @ordered
	 */
	public static final int RX_VALUE = 3;

	/**
	 * The '<em><b>RY</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #RY
	 * @generated
	 * @ordered
	 */
	public static final int RY_VALUE = 4;

	/**
	 * The '<em><b>RZ</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #RZ
	 * @generated
	 * @ordered
	 */
	public static final int RZ_VALUE = 5;

	/**
	 * An array of all the '<em><b>Component</b></em>' enumerators.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private static final Component[] VALUES_ARRAY =
		new Component[] {
			UX,
			UY,
			UZ,
			RX,
			RY,
			RZ,
		};

	/**
	 * A public read-only list of all the '<em><b>Component</b></em>' enumerators.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public static final List<Component> VALUES = Collections.unmodifiableList(Arrays.asList(VALUES_ARRAY));

	/**
	 * Returns the '<em><b>Component</b></em>' literal with the specified literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param literal the literal.
	 * @return the matching enumerator or <code>null</code>.
	 * @generated
	 */
	public static Component get(String literal) {
		for (int i = 0; i < VALUES_ARRAY.length; ++i) {
			Component result = VALUES_ARRAY[i];
			if (result.toString().equals(literal)) {
				return result;
			}
		}
		return null;
	}

	/**
	 * Returns the '<em><b>Component</b></em>' literal with the specified name.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param name the name.
	 * @return the matching enumerator or <code>null</code>.
	 * @generated
	 */
	public static Component getByName(String name) {
		for (int i = 0; i < VALUES_ARRAY.length; ++i) {
			Component result = VALUES_ARRAY[i];
			if (result.getName().equals(name)) {
				return result;
			}
		}
		return null;
	}

	/**
	 * Returns the '<em><b>Component</b></em>' literal with the specified integer value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the integer value.
	 * @return the matching enumerator or <code>null</code>.
	 * @generated
	 */
	public static Component get(int value) {
		switch (value) {
			case UX_VALUE: return UX;
			case UY_VALUE: return UY;
			case UZ_VALUE: return UZ;
			case RX_VALUE: return RX;
			case RY_VALUE: return RY;
			case RZ_VALUE: return RZ;
		}
		return null;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private final int value;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private final String name;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private final String literal;

	/**
	 * Only this class can construct instances.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private Component(int value, String name, String literal) {
		this.value = value;
		this.name = name;
		this.literal = literal;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public int getValue() {
	  return value;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getName() {
	  return name;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getLiteral() {
	  return literal;
	}

	/**
	 * Returns the literal value of the enumerator, which is its string representation.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String toString() {
		return literal;
	}
	
} //Component
