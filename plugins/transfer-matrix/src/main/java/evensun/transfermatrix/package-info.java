/**
 * Flat thin films and thick layers by the transfer-matrix method: the side that faces the contract.
 *
 * <p>Here problems are checked, designs are laid out in the order the light meets their layers, and
 * spectra are summed. The numbers themselves are found in {@link evensun.transfermatrix.kernel}.
 */
package evensun.transfermatrix;
