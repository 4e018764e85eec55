/** Flat thin films and thick layers by the transfer-matrix method. */
package evensun.transfermatrix;
