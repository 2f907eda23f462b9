/**
 * What a run says: one writer a format, the explanation of a figure, and the text of the catalogue
 * and of the findings' pages. Every text that comes from a plan passes {@link
 * dev.holdfast.report.Safe} on its way out.
 *
 * <p>Nothing here judges or computes. This package uses {@code check}, {@code history}, {@code
 * plan} and the catalogue's own words of {@code design}.
 */
package dev.holdfast.report;
