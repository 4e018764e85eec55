/**
 * Any program as a solver: one JSON request per line on its standard input, one JSON answer per
 * line on its standard output.
 *
 * <p>A program is asked twice. {@code prepare} carries what stays fixed and the first design:
 *
 * <pre>{"id": 1, "evensun": 1, "request": "prepare", "problem": {
 *   "wavelengthNm": [w], "incidentMaPerCm2": [w],
 *   "layers": [{"name": "...", "coherent": true}], "incidentMaterial": 0, "exitMaterial": 1,
 *   "incidences": [{"angleDeg": 0, "polarisation": "unpolarised", "side": "front"}],
 *   "seed": 7, "wantedErrorMaPerCm2": 0.01, "options": {}},
 *  "start": {"thicknessNm": [l], "material": [l], "n": [m][w], "k": [m][w]}}</pre>
 *
 * <p>answered by {@code {"id": 1, "ready": true}}, or by {@code {"id": 1, "unsupported": "what, why
 * and what to do"}} in one line. {@code evaluate} carries designs; {@code rows} are the materials
 * that differ from those sent before, in the order of the designs:
 *
 * <pre>{"id": 2, "request": "evaluate", "designs": [
 *   {"thicknessNm": [l], "material": [l], "rows": [{"material": 2, "n": [w], "k": [w]}]}]}</pre>
 *
 * <p>answered by one entry for each design, each with every row, or with the reason why it failed:
 *
 * <pre>
 * {"id": 2, "answers": [{"reflectance": [i][w], "transmittance": [i][w], "absorptance": [i*L + l][w]},
 *              {"failed": "one line"}]}</pre>
 *
 * <p>Every request gets one line, with the {@code id} of the request. A program may be asked to
 * prepare again at any time, and ends when its standard input does. What it writes to standard
 * error is shown with the result.
 */
package evensun.externalprocess;
