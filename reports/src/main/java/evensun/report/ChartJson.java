package evensun.report;

import evensun.report.chart.Chart;
import tools.jackson.core.StreamWriteFeature;
import tools.jackson.core.json.JsonFactory;
import tools.jackson.databind.MapperFeature;
import tools.jackson.databind.ObjectMapper;
import tools.jackson.databind.json.JsonMapper;

/** A chart as the JSON block that its script reads. */
public final class ChartJson {

  private static final ObjectMapper MAPPER =
      JsonMapper.builder(
              JsonFactory.builder().enable(StreamWriteFeature.USE_FAST_DOUBLE_WRITER).build())
          .disable(MapperFeature.SORT_PROPERTIES_ALPHABETICALLY)
          .build();

  private ChartJson() {}

  /** JSON that may stand inside a script element: no {@code <} can end it. */
  public static String of(Chart chart) {
    return MAPPER.writeValueAsString(chart).replace("<", "\\u003c");
  }
}
