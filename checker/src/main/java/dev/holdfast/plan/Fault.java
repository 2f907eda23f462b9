package dev.holdfast.plan;

import tools.jackson.databind.JsonNode;

/**
 * Where a plan breaks the schema.
 *
 * @param pointer JSON Pointer of the value, in the plan
 * @param keyword the keyword of JSON Schema that it breaks
 * @param property the key that is missing, unknown or no name; null for other keywords
 * @param limit what the keyword asks for
 * @param schema path of the schema file that asks for it
 * @param owner the object of that file in which the keyword stands
 * @param within JSON Pointer of that object in the file
 */
record Fault(
    String pointer,
    String keyword,
    String property,
    JsonNode limit,
    String schema,
    JsonNode owner,
    String within) {}
