package evensun.report.figure;

import evensun.report.figure.Shape.Anchor;
import evensun.report.text.Clip;
import evensun.result.Textured;
import evensun.result.Textured.Outline;
import evensun.result.Textured.RayPath;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.stream.DoubleStream;

/**
 * A section through boundaries with a few rays in one ink, as wide as the light that is left. Each
 * boundary is shown with its surroundings to scale; what lies between is left out with a break. The
 * section repeats sideways, so that a ray which leaves on one side comes back on the other.
 *
 * @param section what is drawn
 * @param roles class of the style sheet by the name of a medium
 */
public record RayPicture(Textured.Section section, Map<String, String> roles)
    implements Figure.Sketch {

  private static final double MOST_PX = 460;
  private static final double BREAK_PX = 26;
  private static final double MARGIN_PX = 6;
  private static final double RAY_PX = 3.4;
  private static final double LEAST_PX = 0.5;

  /** Surroundings of a boundary over the width of the section. */
  private static final double PADDING = 0.12;

  /** Copies the roles. */
  public RayPicture {
    roles = Map.copyOf(roles);
  }

  /** Whether something between boundaries is left out. */
  public static boolean isBroken(Textured.Section section) {
    return new RayPicture(section, Map.of()).zones().size() > 1;
  }

  /** A stretch of depth that is shown, with the boundaries in it; µm. */
  private record Zone(double top, double bottom, List<Outline> outlines) {}

  /** Where a zone stands on the canvas. */
  private record Frame(double left, double top, double pxPerUm, double fromX, double fromZ) {

    double x(double um) {
      return left + (um - fromX) * pxPerUm;
    }

    double y(double um) {
      return top + (um - fromZ) * pxPerUm;
    }
  }

  private double fromX() {
    return section.outlines().stream().mapToDouble(o -> o.xUm().get(0)).min().orElse(0);
  }

  private double widthUm() {
    double toX =
        section.outlines().stream()
            .mapToDouble(o -> o.xUm().get(o.xUm().size() - 1))
            .max()
            .orElse(1);
    return Math.max(toX - fromX(), 1e-9);
  }

  private List<Zone> zones() {
    double padding = PADDING * widthUm();
    List<Zone> zones = new ArrayList<>();
    for (Outline outline : section.outlines()) {
      double top = heights(outline).min().orElse(0) - padding;
      double bottom = heights(outline).max().orElse(0) + padding;
      Zone last = zones.isEmpty() ? null : zones.get(zones.size() - 1);
      if (last != null && top <= last.bottom()) {
        List<Outline> both = new ArrayList<>(last.outlines());
        both.add(outline);
        zones.set(zones.size() - 1, new Zone(last.top(), Math.max(bottom, last.bottom()), both));
      } else {
        zones.add(new Zone(top, bottom, List.of(outline)));
      }
    }
    return zones;
  }

  private static DoubleStream heights(Outline outline) {
    return outline.zUm().stream().mapToDouble(z -> z);
  }

  @Override
  public Drawing draw(double widthPx) {
    Canvas canvas = new Canvas(widthPx);
    List<Zone> zones = zones();
    double deepUm = zones.stream().mapToDouble(z -> z.bottom() - z.top()).sum();
    double pxPerUm = Math.min((widthPx - 2 * MARGIN_PX) / widthUm(), MOST_PX / deepUm);
    double left = (widthPx - widthUm() * pxPerUm) / 2;
    double y = MARGIN_PX;
    for (int i = 0; i < zones.size(); i++) {
      Zone zone = zones.get(i);
      if (i > 0) {
        gap(canvas, left, y, widthUm() * pxPerUm);
        y += BREAK_PX;
      }
      zone(canvas, zone, new Frame(left, y, pxPerUm, fromX(), zone.top()));
      y += (zone.bottom() - zone.top()) * pxPerUm;
    }
    return canvas.drawing(y + MARGIN_PX);
  }

  private void zone(Canvas canvas, Zone zone, Frame frame) {
    double wide = widthUm() * frame.pxPerUm();
    double high = (zone.bottom() - zone.top()) * frame.pxPerUm();
    String first = zone.outlines().get(0).above();
    canvas.box(frame.left(), frame.top(), wide, high, "region fill-" + role(first), first);
    for (Outline outline : zone.outlines()) {
      region(canvas, outline, zone, frame);
    }
    for (RayPath path : section.paths()) {
      ray(canvas, path, zone, frame);
    }
    for (Outline outline : zone.outlines()) {
      canvas.outline(line(outline, frame), "facet", outline.above() + " on " + outline.below());
    }
    names(canvas, zone, frame);
  }

  private String role(String medium) {
    return roles.getOrDefault(medium, "medium");
  }

  /** The medium below a boundary, down to the end of the zone. */
  private void region(Canvas canvas, Outline outline, Zone zone, Frame frame) {
    int last = outline.xUm().size() - 1;
    Path path = line(outline, frame);
    path.line(frame.x(outline.xUm().get(last)), frame.y(zone.bottom()));
    path.line(frame.x(outline.xUm().get(0)), frame.y(zone.bottom())).close();
    canvas.outline(path, "region fill-" + role(outline.below()), outline.below());
  }

  private static Path line(Outline outline, Frame frame) {
    Path path = new Path();
    for (int i = 0; i < outline.xUm().size(); i++) {
      double x = frame.x(outline.xUm().get(i));
      double y = frame.y(outline.zUm().get(i));
      if (i == 0) {
        path.move(x, y);
      } else {
        path.line(x, y);
      }
    }
    return path;
  }

  private void names(Canvas canvas, Zone zone, Frame frame) {
    double x = frame.left() + 8;
    String first = Clip.to(zone.outlines().get(0).above(), 30);
    canvas.label(x, frame.top() + 15, first, Anchor.START, "part-name halo");
    Outline last = zone.outlines().get(zone.outlines().size() - 1);
    canvas.label(
        x, frame.y(zone.bottom()) - 6, Clip.to(last.below(), 30), Anchor.START, "part-name halo");
  }

  private static void gap(Canvas canvas, double x, double y, double wide) {
    for (double at : new double[] {y + 8, y + BREAK_PX - 10}) {
      Path path = new Path().move(x, at);
      int teeth = (int) (wide / 12);
      for (int i = 1; i <= teeth; i++) {
        path.line(x + wide * i / teeth, at + (i % 2 == 0 ? 0 : 4));
      }
      canvas.outline(path, "leader", "");
    }
  }

  /** The part of a piece inside a zone, cut where it leaves the section sideways. */
  private void ray(Canvas canvas, RayPath path, Zone zone, Frame frame) {
    double dz = path.endZUm() - path.startZUm();
    double from = 0;
    double to = 1;
    if (dz != 0) {
      double a = (zone.top() - path.startZUm()) / dz;
      double b = (zone.bottom() - path.startZUm()) / dz;
      from = Math.max(from, Math.min(a, b));
      to = Math.min(to, Math.max(a, b));
    } else if (path.startZUm() < zone.top() || path.startZUm() > zone.bottom()) {
      return;
    }
    double at = from;
    while (at < to) {
      double next = Math.min(to, leaves(path, at));
      piece(canvas, path, at, next, frame);
      at = next;
    }
  }

  /** Share of the piece at which it leaves the copy of the section that it is in. */
  private double leaves(RayPath path, double at) {
    double dx = path.endXUm() - path.startXUm();
    if (dx == 0) {
      return 1;
    }
    double middle = copy(path.startXUm() + (at + 1e-9) * dx);
    double edge = fromX() + (middle + (dx > 0 ? 1 : 0)) * widthUm();
    return Math.max(at + 1e-6, (edge - path.startXUm()) / dx);
  }

  private double copy(double xUm) {
    return Math.floor((xUm - fromX()) / widthUm());
  }

  private void piece(Canvas canvas, RayPath path, double from, double to, Frame frame) {
    double dx = path.endXUm() - path.startXUm();
    double dz = path.endZUm() - path.startZUm();
    double shift = copy(path.startXUm() + 0.5 * (from + to) * dx) * widthUm();
    double x1 = frame.x(path.startXUm() + from * dx - shift);
    double y1 = frame.y(path.startZUm() + from * dz);
    double x2 = frame.x(path.startXUm() + to * dx - shift);
    double y2 = frame.y(path.startZUm() + to * dz);
    double long1 = Math.max(Math.hypot(x2 - x1, y2 - y1), 1e-6);
    double nx = (y1 - y2) / long1 / 2;
    double ny = (x2 - x1) / long1 / 2;
    double w1 = inkPx(path, from);
    double w2 = inkPx(path, to);
    canvas.outline(
        new Path()
            .move(x1 + nx * w1, y1 + ny * w1)
            .line(x2 + nx * w2, y2 + ny * w2)
            .line(x2 - nx * w2, y2 - ny * w2)
            .line(x1 - nx * w1, y1 - ny * w1)
            .close(),
        "ray",
        "");
  }

  private static double inkPx(RayPath path, double at) {
    double share = path.startShare() + at * (path.endShare() - path.startShare());
    return Math.max(LEAST_PX, RAY_PX * share);
  }
}
