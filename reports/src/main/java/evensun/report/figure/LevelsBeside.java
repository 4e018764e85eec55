package evensun.report.figure;

import evensun.report.figure.LevelPicture.Vessel;
import evensun.report.figure.Shape.Anchor;
import evensun.report.text.Clip;
import evensun.report.text.Numbers;
import java.util.List;
import org.jspecify.annotations.Nullable;

/**
 * The level pictures of several designs beside one another, to one scale.
 *
 * @param designs at least one
 */
public record LevelsBeside(List<Design> designs) implements Figure.Sketch {

  /**
   * A design.
   *
   * @param letter what it goes by
   * @param vessels its subcells in the order the light meets them
   * @param levelMaPerCm2 what it passes; null where its subcells are apart
   */
  public record Design(String letter, List<Vessel> vessels, @Nullable Double levelMaPerCm2) {

    /** Copies the subcells. */
    public Design {
      vessels = List.copyOf(vessels);
    }
  }

  private static final double HEIGHT = LevelPicture.TOP + LevelPicture.DEPTH + 62;
  private static final double WIDEST_PX = 74;
  private static final double ROOM_FOR_A_VALUE_PX = 36;
  private static final double LETTER_PX = 7;

  /** Copies the designs. */
  public LevelsBeside {
    designs = List.copyOf(designs);
  }

  @Override
  public Drawing draw(double widthPx) {
    Canvas canvas = new Canvas(widthPx);
    double slot = (widthPx - LevelPicture.LEFT) / designs.size();
    LevelPicture.scale(canvas, widthPx, ceiling());
    for (int i = 0; i < designs.size(); i++) {
      design(canvas, designs.get(i), LevelPicture.LEFT + slot * i, slot);
    }
    return canvas.drawing(HEIGHT);
  }

  private double ceiling() {
    double largest =
        designs.stream()
            .flatMap(design -> design.vessels().stream())
            .mapToDouble(Vessel::maPerCm2)
            .max()
            .orElse(0);
    return Math.max(1e-9, largest * 1.04);
  }

  private void design(Canvas canvas, Design design, double left, double slot) {
    int count = design.vessels().size();
    double pitch = Math.min(slot * 0.84 / count, WIDEST_PX * 1.12);
    double wide = pitch / 1.12;
    double start = left + (slot - pitch * count) / 2;
    for (int i = 0; i < count; i++) {
      vessel(canvas, design, i, start + i * pitch + (pitch - wide) / 2, wide);
    }
    Double level = design.levelMaPerCm2();
    if (level != null) {
      double y = LevelPicture.y(level, LevelPicture.DEPTH / ceiling());
      canvas.stroke(start - 3, y, start + pitch * count + 3, y, "level");
    }
    double bottom = LevelPicture.TOP + LevelPicture.DEPTH;
    double centre = left + slot / 2;
    canvas.label(centre, bottom + 38, design.letter(), Anchor.MIDDLE, "name");
    if (level != null) {
      String passes = (slot > 110 ? "passes " : "") + Numbers.fixed(level, 2);
      canvas.label(centre, bottom + 55, passes, Anchor.MIDDLE, "part-value");
    }
  }

  private void vessel(Canvas canvas, Design design, int index, double x, double wide) {
    Vessel vessel = design.vessels().get(index);
    String role = Share.subcellRole(index);
    double pxPerMa = LevelPicture.DEPTH / ceiling();
    Double level = design.levelMaPerCm2();
    double held = level == null ? vessel.maPerCm2() : Math.min(level, vessel.maPerCm2());
    double line = LevelPicture.y(held, pxPerMa);
    LevelPicture.body(canvas, x, wide, line, LevelPicture.y(vessel.maPerCm2(), pxPerMa), role);
    double bottom = LevelPicture.TOP + LevelPicture.DEPTH;
    if (wide > ROOM_FOR_A_VALUE_PX) {
      String value = Numbers.fixed(vessel.maPerCm2(), 2);
      double y = Math.min(line + 20, bottom - 6);
      canvas.label(x + wide / 2, y, value, Anchor.MIDDLE, "part-value on-" + role);
      String name = Clip.to(vessel.name(), (int) Math.max(3, wide / LETTER_PX));
      canvas.label(x + wide / 2, bottom + 17, name, Anchor.MIDDLE, "tick");
    }
  }
}
