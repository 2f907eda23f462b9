/**
 * Cells whose outcome is continuous: means of one group, of pairs, of two and of more groups. A
 * class here is one cell, or what several of these cells share.
 */
package dev.holdfast.design.continuous;
