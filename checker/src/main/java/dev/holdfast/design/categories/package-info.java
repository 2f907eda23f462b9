/** Cells whose outcome is one of several categories: tables and their chi-square tests. */
package dev.holdfast.design.categories;
