/** Cells whose outcome is a share: of one group, of two groups, of pairs. */
package dev.holdfast.design.binary;
