package org.modewright.exchange.internal.tables;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.regex.Pattern;

/** Rules for paths inside a package: relative, with forward slashes, never out of the package. */
final class PackagePath {

    private static final Pattern SCHEME_OR_DRIVE = Pattern.compile("[A-Za-z][A-Za-z0-9+.-]*:.*", Pattern.DOTALL);

    private PackagePath() {
    }

    /** Why the path may not stand in a package; empty where it may. */
    static Optional<String> objection(String path) {
        if (path.isBlank()) {
            return Optional.of("the path is empty");
        }
        if (path.chars().anyMatch(Character::isISOControl)) {
            return Optional.of("the path holds a control character");
        }
        if (path.indexOf('\\') >= 0) {
            return Optional.of("the path holds a backslash; separate folders by /");
        }
        if (path.startsWith("/") || path.startsWith("~") || SCHEME_OR_DRIVE.matcher(path).matches()) {
            return Optional.of("the path leaves the package; give a path relative to datapackage.json");
        }
        if (List.of(path.split("/", -1)).contains("..")) {
            return Optional.of("the path leaves the package; no part of it may be \"..\"");
        }
        return Optional.empty();
    }

    /** The path without parts that say nothing. */
    static String normalised(String path) {
        List<String> parts = new ArrayList<>(List.of(path.split("/")));
        parts.removeIf(part -> part.isEmpty() || part.equals("."));
        return String.join("/", parts);
    }
}
