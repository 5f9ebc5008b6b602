/**
 * The batch: measurement folders in, an archive of results with manifests and an index out.
 *
 * <p>Comes in: folders to look through and a plan. Goes out: files, each complete under its name or
 * not there at all. Start at {@link org.crossreach.archive.ArchiveRun}. Called by {@code cli} only.
 */
package org.crossreach.archive;
