package dev.holdfast.plan;

import java.util.Map;

/**
 * What a quantity rests on.
 *
 * @param kind {@code published-study}, {@code meta-analysis}, {@code pilot-data}, {@code
 *     own-records}, {@code smallest-worthwhile}, {@code expert-judgement}, {@code convention},
 *     {@code regulation} or {@code assumption}
 * @param fields the other fields in the order of the file, such as {@code cite}, {@code doi},
 *     {@code reason}, as they are written; of a nested section the text is empty
 * @param place where the section starts
 */
public record Source(String kind, Map<String, Word> fields, Place place) {}
