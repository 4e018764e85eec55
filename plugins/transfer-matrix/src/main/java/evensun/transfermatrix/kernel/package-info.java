/**
 * The arithmetic of light in flat stacks: primitive arrays in, primitive arrays out.
 *
 * <p>Media are numbered in the order the light meets them: 0 the medium it comes from, 1 to N the
 * finite layers that are present, N + 1 the medium behind. Runs of coherent layers are packets,
 * bounded by thick media: the two half-spaces and the incoherent layers.
 */
package evensun.transfermatrix.kernel;
