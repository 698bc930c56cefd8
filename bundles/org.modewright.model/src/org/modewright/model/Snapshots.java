package org.modewright.model;

import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.HexFormat;

import org.eclipse.emf.ecore.util.EcoreUtil;
import org.modewright.model.structure.StructuralModel;

/**
 * Copies of a model for work that goes on while the model is edited, and the hash that says whether a result still belongs to it.
 */
public final class Snapshots {

    private Snapshots() {
    }

    /**
     * @param model a model
     * @return a deep copy that shares nothing with it
     */
    public static StructuralModel copy(StructuralModel model) {
        return EcoreUtil.copy(model);
    }

    /**
     * @param model a model whose objects all have ids
     * @return SHA-256 of {@link ModelFile#bytes}, lower-case hexadecimal: the hash of the file that {@link ModelFile#save} writes
     * @throws ModelFileException if the model holds something that a file cannot hold
     */
    public static String sha256(StructuralModel model) throws ModelFileException {
        return sha256(ModelFile.bytes(model));
    }

    /**
     * @param bytes content of a file
     * @return its SHA-256, lower-case hexadecimal
     */
    public static String sha256(byte[] bytes) {
        try {
            return HexFormat.of().formatHex(MessageDigest.getInstance("SHA-256").digest(bytes));
        } catch (NoSuchAlgorithmException e) {
            throw new IllegalStateException("every Java platform has SHA-256", e);
        }
    }
}
