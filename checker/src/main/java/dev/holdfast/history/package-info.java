/**
 * Plans at other revisions: reading them from the index or from a commit through the {@code git}
 * executable.
 *
 * <p>Nothing here judges a plan. Nothing of a repository but its blobs is read, and nothing of it
 * is run. This package may use {@code check} and {@code plan}.
 */
package dev.holdfast.history;
