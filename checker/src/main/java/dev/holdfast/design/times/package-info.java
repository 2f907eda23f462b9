/** Cells whose outcome is the time to an event. */
package dev.holdfast.design.times;
