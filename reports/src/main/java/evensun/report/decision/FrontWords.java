package evensun.report.decision;

import evensun.report.text.Keys;
import evensun.report.text.Numbers;
import evensun.result.SearchRecord;
import evensun.result.SearchRecord.Front;
import evensun.result.SearchRecord.FrontPoint;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** What a front offers, in words. */
public final class FrontWords {

  private FrontWords() {}

  /** What it spans, which design is reported, how to get another; absent for a single aim. */
  public static Optional<String> of(SearchRecord search) {
    return Optional.ofNullable(search.front())
        .filter(front -> !front.points().isEmpty())
        .map(FrontWords::sentence);
  }

  /** Name of a design of a front: its number, and what it is. */
  public static String name(Front front, int point) {
    String number = Integer.toString(point + 1);
    String what = point == front.knee() ? ", best compromise" : "";
    return number + what + (point == front.shown() ? ", reported here" : "");
  }

  private static String sentence(Front front) {
    int count = front.points().size();
    String reported =
        front.shown() == front.knee()
            ? "its best compromise, number " + (front.shown() + 1)
            : "number " + (front.shown() + 1);
    return "No design is better in every aim than one of these "
        + count
        + ": from "
        + aims(front, front.points().get(0))
        + " to "
        + aims(front, front.points().get(count - 1))
        + ". Reported here is "
        + reported
        + "; evensun design --resume RUN --point N --out FOLDER reports another.";
  }

  private static String aims(Front front, FrontPoint point) {
    List<String> aims = new ArrayList<>();
    for (int i = 0; i < front.aims().size(); i++) {
      aims.add(
          Keys.aim(front.aims().get(i))
              + " "
              + Numbers.quantity(point.aims().get(i), front.units().get(i)));
    }
    return String.join(", ", aims);
  }
}
