/** Cells without groups: how two or more variables go together. */
package dev.holdfast.design.association;
