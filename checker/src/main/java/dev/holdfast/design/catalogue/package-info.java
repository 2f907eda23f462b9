/**
 * The list of all cells. It stands apart from the cells' common ground so that no arrow of the
 * design packages points both ways: cells use {@code design}, and only this package knows the
 * cells.
 */
package dev.holdfast.design.catalogue;
