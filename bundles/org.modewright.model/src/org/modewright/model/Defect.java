package org.modewright.model;

import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EStructuralFeature;

/**
 * Something in a model that keeps it from being computed, or that is likely not meant.
 *
 * @param id       stable name of the check, one of {@link WellFormedness#checks()}
 * @param severity how much it matters
 * @param object   object at fault
 * @param feature  its feature at fault, or null where the whole object is
 * @param text     one sentence: what is wrong
 * @param remedy   one sentence: what to do
 */
public record Defect(String id, Severity severity, EObject object, EStructuralFeature feature, String text, String remedy) {
}
