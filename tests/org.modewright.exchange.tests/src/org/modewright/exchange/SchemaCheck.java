package org.modewright.exchange;

import java.util.ArrayList;
import java.util.Iterator;
import java.util.List;

import com.fasterxml.jackson.databind.JsonNode;

/** Checks a JSON document against a JSON schema: the keywords that the schema of the result file uses, and no others. */
final class SchemaCheck {

    private static final List<String> KEYWORDS = List.of("$schema", "$defs", "$ref", "title", "type", "additionalProperties", "required",
            "properties", "items", "enum", "pattern");

    private final JsonNode root;
    private final List<String> faults = new ArrayList<>();

    private SchemaCheck(JsonNode root) {
        this.root = root;
    }

    /** What does not follow the schema, with its place. */
    static List<String> faults(JsonNode schema, JsonNode document) {
        SchemaCheck check = new SchemaCheck(schema);
        check.check(schema, document, "");
        return check.faults;
    }

    private void check(JsonNode schema, JsonNode value, String place) {
        for (Iterator<String> names = schema.fieldNames(); names.hasNext();) {
            String name = names.next();
            if (!KEYWORDS.contains(name)) {
                throw new IllegalArgumentException("The schema uses the keyword " + name + ", which is not checked here.");
            }
        }
        if (schema.has("$ref")) {
            check(root.at(schema.path("$ref").asText().substring(1)), value, place);
            return;
        }
        type(schema.path("type"), value, place);
        if (schema.has("enum") && !contains(schema.path("enum"), value)) {
            faults.add(place + " is " + value);
        }
        if (schema.has("pattern") && !value.asText().matches(schema.path("pattern").asText())) {
            faults.add(place + " is " + value);
        }
        members(schema, value, place);
        for (int i = 0; schema.has("items") && i < value.size(); i++) {
            check(schema.path("items"), value.get(i), place + "/" + i);
        }
    }

    private void members(JsonNode schema, JsonNode value, String place) {
        for (JsonNode required : schema.path("required")) {
            if (!value.has(required.asText())) {
                faults.add(place + "/" + required.asText() + " is missing");
            }
        }
        for (Iterator<String> names = value.fieldNames(); schema.has("properties") && names.hasNext();) {
            String name = names.next();
            if (schema.path("properties").has(name)) {
                check(schema.path("properties").path(name), value.path(name), place + "/" + name);
            } else {
                faults.add(place + "/" + name + " is not in the schema");
            }
        }
    }

    private static boolean contains(JsonNode words, JsonNode value) {
        for (JsonNode word : words) {
            if (word.equals(value)) {
                return true;
            }
        }
        return false;
    }

    private void type(JsonNode type, JsonNode value, String place) {
        if (type.isMissingNode()) {
            return;
        }
        boolean fits = false;
        for (JsonNode word : type.isArray() ? type : List.of(type)) {
            fits |= fits(word.asText(), value);
        }
        if (!fits) {
            faults.add(place + " is no " + type + " but " + value);
        }
    }

    private static boolean fits(String type, JsonNode value) {
        return switch (type) {
            case "object" -> value.isObject();
            case "array" -> value.isArray();
            case "string" -> value.isTextual();
            case "number" -> value.isNumber();
            case "integer" -> value.isIntegralNumber();
            case "boolean" -> value.isBoolean();
            case "null" -> value.isNull();
            default -> throw new IllegalArgumentException("The type " + type + " is not known.");
        };
    }
}
