package evensun.report.chart;

import java.io.StringWriter;
import java.util.List;
import org.jspecify.annotations.Nullable;
import tools.jackson.core.JsonGenerator;
import tools.jackson.core.ObjectWriteContext;
import tools.jackson.core.StreamWriteFeature;
import tools.jackson.core.json.JsonFactory;

/**
 * A chart as the JSON block that its script reads. Written field by field: to have records looked
 * at by reflection takes longer than to write a page.
 */
public final class ChartJson {

  private static final JsonFactory FACTORY =
      JsonFactory.builder().enable(StreamWriteFeature.USE_FAST_DOUBLE_WRITER).build();

  private ChartJson() {}

  /** JSON that may stand inside a script element: no {@code <} can end it. */
  public static String of(Chart chart) {
    StringWriter text = new StringWriter();
    try (JsonGenerator json = FACTORY.createGenerator(ObjectWriteContext.empty(), text)) {
      json.writeStartObject();
      json.writeStringProperty("id", chart.id());
      json.writeStringProperty("kind", chart.kind().name());
      json.writeStringProperty("title", chart.title());
      axis(json, "x", chart.x());
      axis(json, "y", chart.y());
      numbers(json, "xs", chart.xs());
      series(json, chart.series());
      marks(json, chart.marks());
      json.writeEndObject();
    }
    return text.toString().replace("<", "\\u003c");
  }

  private static void axis(JsonGenerator json, String name, Axis axis) {
    json.writeObjectPropertyStart(name);
    json.writeStringProperty("label", axis.label());
    json.writeStringProperty("unit", axis.unit());
    json.writeNumberProperty("min", axis.min());
    json.writeNumberProperty("max", axis.max());
    json.writeBooleanProperty("logarithmic", axis.logarithmic());
    json.writeEndObject();
  }

  private static void series(JsonGenerator json, List<Series> series) {
    json.writeArrayPropertyStart("series");
    for (Series row : series) {
      json.writeStartObject();
      json.writeStringProperty("label", row.label());
      json.writeStringProperty("role", row.role());
      json.writeBooleanProperty("dashed", row.dashed());
      numbers(json, "values", row.values());
      json.writeEndObject();
    }
    json.writeEndArray();
  }

  private static void marks(JsonGenerator json, List<Mark> marks) {
    json.writeArrayPropertyStart("marks");
    for (Mark mark : marks) {
      json.writeStartObject();
      json.writeNumberProperty("x", mark.x());
      json.writeStringProperty("label", mark.label());
      json.writeEndObject();
    }
    json.writeEndArray();
  }

  private static void numbers(
      JsonGenerator json, String name, List<? extends @Nullable Double> values) {
    json.writeArrayPropertyStart(name);
    for (Double value : values) {
      if (value == null) {
        json.writeNull();
      } else {
        json.writeNumber(value);
      }
    }
    json.writeEndArray();
  }
}
