package evensun.transfermatrix.kernel;

/** What the solution of one polarisation reads: the stack and its coefficients. */
final class Optics {

  final MediumRows media;
  final Phases phases;
  final Admittances eta;
  final Faces faces;

  /** The stack; set before each solution. */
  Layout layout;

  Optics(MediumRows media, Phases phases, Admittances eta, Faces faces) {
    this.media = media;
    this.phases = phases;
    this.eta = eta;
    this.faces = faces;
  }

  void refresh(Layout stack) {
    layout = stack;
    faces.refresh(stack, media, eta);
  }
}
