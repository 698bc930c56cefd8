package org.modewright.exchange.internal.tables;

import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.PushbackReader;
import java.io.Reader;
import java.nio.charset.CodingErrorAction;
import java.nio.charset.StandardCharsets;
import java.util.Iterator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.stream.Collectors;
import java.util.stream.Stream;

import org.modewright.model.structure.MassFormulation;
import org.modewright.model.structure.UnitSystem;

import com.fasterxml.jackson.core.JsonParser;
import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.databind.DeserializationFeature;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.json.JsonMapper;

/** Reads {@code datapackage.json}; every fault becomes a problem with its place. */
final class DescriptorReader {

    private static final String FILE = PackageContent.DESCRIPTOR;
    private static final Set<String> STRUCTURE = Set.of("version", "units", "gravity", "massMatrix", "shearDeformation");
    private static final int BYTE_ORDER_MARK = 0xFEFF;

    private final ProblemList problems;
    private final List<String> warnings;

    DescriptorReader(ProblemList problems, List<String> warnings) {
        this.problems = problems;
        this.warnings = warnings;
    }

    /** The description, or null where it cannot be read at all. */
    Descriptor read(PackageContent content) {
        JsonNode root = parse(content);
        if (root == null) {
            return null;
        }
        JsonNode structure = root.path("structure");
        if (!structure.isObject()) {
            fault("structure", "", "the property is missing; write \"structure\": {\"version\": 1, \"units\": \"kN-m-t\"}");
        }
        unknownProperties(structure);
        version(structure.path("version"));
        return new Descriptor(text(root, "name"), text(root, "title"), text(root, "description"), units(structure), gravity(structure),
                mass(structure), shearDeformation(structure), resources(root.path("resources")));
    }

    private JsonNode parse(PackageContent content) {
        if (!content.has(FILE)) {
            fault("", "", "the file is missing; a table package is described by a datapackage.json at its root");
            return null;
        }
        JsonMapper mapper = JsonMapper.builder().enable(JsonParser.Feature.STRICT_DUPLICATE_DETECTION)
                .enable(DeserializationFeature.FAIL_ON_TRAILING_TOKENS).build();
        try (InputStream in = content.open(FILE); Reader reader = utf8(in)) {
            JsonNode root = mapper.readTree(reader);
            if (root.isObject()) {
                return root;
            }
            fault("", "", "the file must hold one JSON object");
        } catch (JsonProcessingException e) {
            int line = e.getLocation() == null ? 0 : e.getLocation().getLineNr();
            int column = e.getLocation() == null ? 0 : e.getLocation().getColumnNr();
            problems.add(FILE, line, String.valueOf(column), "", "this is not valid JSON: " + e.getOriginalMessage());
        } catch (IOException e) {
            fault("", "", FaultText.of(e));
        }
        return null;
    }

    /** UTF-8 text without a byte order mark; other encodings are a fault, never silently replaced characters. */
    static Reader utf8(InputStream in) throws IOException {
        PushbackReader reader = new PushbackReader(new InputStreamReader(in, StandardCharsets.UTF_8.newDecoder()
                .onMalformedInput(CodingErrorAction.REPORT).onUnmappableCharacter(CodingErrorAction.REPORT)));
        int first = reader.read();
        if (first >= 0 && first != BYTE_ORDER_MARK) {
            reader.unread(first);
        }
        return reader;
    }

    private void unknownProperties(JsonNode structure) {
        for (Iterator<String> names = structure.fieldNames(); names.hasNext();) {
            String name = names.next();
            if (!STRUCTURE.contains(name)) {
                warnings.add(FILE + ": the property structure/" + name + " is not known and was ignored");
            }
        }
    }

    private void version(JsonNode version) {
        boolean blank = version.isMissingNode() || version.isNull();
        if (!blank && !(version.isIntegralNumber() && version.asLong() == 1)) {
            fault("structure/version", version.asText(version.toString()), "only version 1 can be read");
        }
    }

    private UnitSystem units(JsonNode structure) {
        JsonNode units = structure.path("units");
        UnitSystem system = units.isTextual() ? UnitSystem.get(units.asText()) : null;
        if (system != null || !structure.isObject()) {
            return system == null ? UnitSystem.KILONEWTON_METRE : system;
        }
        String known = Stream.of(UnitSystem.values()).map(UnitSystem::getLiteral).collect(Collectors.joining(", "));
        fault("structure/units", plain(units), (units.isMissingNode() ? "the units are missing" : "this unit system is not known")
                + "; give one of " + known);
        return UnitSystem.KILONEWTON_METRE;
    }

    private double gravity(JsonNode structure) {
        JsonNode gravity = structure.path("gravity");
        if (gravity.isMissingNode() || gravity.isNull() || gravity.isTextual() && gravity.asText().isBlank()) {
            return 0;
        }
        double value = gravity.isNumber() ? gravity.asDouble() : Double.NaN;
        if (!Double.isFinite(value) || value <= 0) {
            fault("structure/gravity", plain(gravity),
                    "the acceleration of gravity must be a positive number, or be left out for 9.80665 m/s2");
            return 0;
        }
        return value;
    }

    private MassFormulation mass(JsonNode structure) {
        JsonNode mass = structure.path("massMatrix");
        MassFormulation formulation = mass.isTextual() ? MassFormulation.get(mass.asText()) : null;
        if (formulation == null && !mass.isMissingNode() && !mass.isNull()) {
            fault("structure/massMatrix", plain(mass), "this mass matrix is not known; give consistent or lumped");
        }
        return formulation == null ? MassFormulation.CONSISTENT : formulation;
    }

    private boolean shearDeformation(JsonNode structure) {
        JsonNode shear = structure.path("shearDeformation");
        boolean blank = shear.isMissingNode() || shear.isNull();
        if (!blank && !shear.isBoolean()) {
            fault("structure/shearDeformation", plain(shear), "give true or false");
        }
        return blank || shear.asBoolean();
    }

    private Map<String, String> resources(JsonNode resources) {
        Map<String, String> paths = new LinkedHashMap<>();
        if (!resources.isArray()) {
            fault("resources", "", "the list of resources is missing; give each table as {\"name\": \"nodes\", \"path\": \"nodes.csv\"}");
            return paths;
        }
        for (int i = 0; i < resources.size(); i++) {
            resource(resources.get(i), "resources/" + i, paths);
        }
        return paths;
    }

    private void resource(JsonNode resource, String pointer, Map<String, String> paths) {
        String name = resource.path("name").asText("");
        if (name.isBlank()) {
            fault(pointer + "/name", plain(resource.path("name")), "the resource has no name");
            return;
        }
        if (TableSchema.ALL.stream().noneMatch(schema -> schema.resource().equals(name))) {
            warnings.add(FILE + ": the resource " + name + " is not known and was ignored");
            safePath(resource, pointer);
            return;
        }
        dialect(resource, pointer);
        String path = safePath(resource, pointer);
        if (path != null && paths.putIfAbsent(name, path) != null) {
            fault(pointer + "/name", name, "the resource is given twice");
        }
    }

    private String safePath(JsonNode resource, String pointer) {
        JsonNode path = resource.path("path");
        JsonNode single = path.isArray() && path.size() == 1 ? path.get(0) : path;
        if (!single.isTextual()) {
            fault(pointer + "/path", plain(path), "give the path of one CSV file inside the package");
            return null;
        }
        String text = single.asText();
        String objection = PackagePath.objection(text).orElse(null);
        if (objection != null) {
            fault(pointer + "/path", text, objection);
            return null;
        }
        return PackagePath.normalised(text);
    }

    private void dialect(JsonNode resource, String pointer) {
        String delimiter = resource.path("dialect").path("delimiter").asText(",");
        if (!delimiter.equals(",")) {
            fault(pointer + "/dialect/delimiter", delimiter, "cells must be separated by commas");
        }
        String encoding = resource.path("encoding").asText("utf-8");
        if (!encoding.equalsIgnoreCase("utf-8") && !encoding.equalsIgnoreCase("utf8")) {
            fault(pointer + "/encoding", encoding, "tables must be UTF-8");
        }
    }

    private String text(JsonNode root, String property) {
        JsonNode value = root.path(property);
        if (!value.isMissingNode() && !value.isNull() && !value.isTextual()) {
            fault(property, plain(value), "this must be text");
        } else if (value.isTextual() && !PlainText.isStorable(value.asText())) {
            fault(property, value.asText(), "the text holds a control character; remove it");
        }
        return value.isTextual() ? value.asText() : null;
    }

    private static String plain(JsonNode value) {
        return value.isMissingNode() ? "" : value.isValueNode() ? value.asText() : value.toString();
    }

    private void fault(String pointer, String value, String text) {
        problems.add(FILE, 0, pointer, value, text);
    }
}
