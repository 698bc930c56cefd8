package org.modewright.ui.editor.pages;

import java.util.Locale;
import org.eclipse.jface.fieldassist.ContentProposal;
import org.eclipse.jface.fieldassist.IContentProposal;
import org.eclipse.jface.fieldassist.IContentProposalProvider;
import org.modewright.ui.editor.fields.Field;

/** Names that begin like the text typed so far, asked for anew each time as the model is edited. */
record NameProposals(Field field) implements IContentProposalProvider {

    private static final int MOST = 40;

    @Override
    public IContentProposal[] getProposals(String contents, int position) {
        String typed = contents.substring(0, Math.min(position, contents.length())).strip().toLowerCase(Locale.ROOT);
        return field.choices().stream().filter(name -> name != null && name.toLowerCase(Locale.ROOT).startsWith(typed)).limit(MOST)
                .map(ContentProposal::new).toArray(IContentProposal[]::new);
    }
}
