/**
 * The catalogue of study designs: a grid of the outcome's scale, the arrangement of the comparison
 * and the test. One class a cell, in one subpackage a scale; what all cells share (allocation, the
 * search for the least sample and the smallest detectable effect, the ledger of steps) is here.
 *
 * <p>Nothing here knows plan files, claims or findings. This package uses {@code numeric} only.
 */
package dev.holdfast.design;
