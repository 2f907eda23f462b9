/**
 * The plan file: finding it, reading it with the place of every key and value, holding it against
 * the schema, replacing the names of quantities by their figures, and the plan as records.
 *
 * <p>Nothing here computes a power or judges a claim, and nothing here knows a study design beyond
 * the words that name it. This package uses no other of the program.
 */
package dev.holdfast.plan;
