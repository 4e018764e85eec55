package evensun.report;

import evensun.result.ResultJson;
import evensun.result.RunResult;

/** Writes the design-review page of a result. */
public final class ReportWriter {

  private ReportWriter() {}

  /** The page as HTML text; the bare data until the page is designed. */
  public static String write(RunResult result) {
    String json = ResultJson.write(result).replace("&", "&amp;").replace("<", "&lt;");
    return "<!doctype html><meta charset=\"utf-8\"><title>Evensun</title><pre>" + json + "</pre>\n";
  }
}
