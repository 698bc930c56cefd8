package org.modewright.cli.internal;

import java.io.PrintWriter;

import org.modewright.audit.RulePack;
import org.modewright.audit.RulePacks;

/** Lists the rule packs at hand. */
final class RuleList {

    private RuleList() {
    }

    static void print(PrintWriter out) {
        for (RulePack pack : RulePacks.builtIn().all()) {
            out.println(pack.id() + "  " + pack.title() + " (version " + pack.version() + ")");
            pack.clauses().forEach(clause -> out.println("    " + clause.id() + ": " + clause.statement()));
            out.println("    Source: " + pack.source() + " (" + pack.provenance() + ")");
        }
    }
}
