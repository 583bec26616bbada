/**
 * One writer per output format, and the publishing of a finished set.
 *
 * <p>Takes artwork on the nanometre grid ({@code Artwork.onGrid()}) and an {@link
 * etchloom.write.OrderInfo}; gives file names and bytes. The writers are pure: no disk, no clock,
 * no locale; the same input gives the same bytes. Lines and arcs stay exact in every format that
 * has arcs. Only {@link etchloom.write.Publisher} touches the disk, all or nothing.
 */
package etchloom.write;
