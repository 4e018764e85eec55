#!/usr/bin/env python3
"""A solver for Evensun in Python, standard library only.

A beam down and a beam up through every layer, weakened as Beer and Lambert say and split at every
face as Fresnel says; no interference. Evensun starts it, writes one JSON request per line to its
standard input and reads one JSON answer per line from its standard output.
"""
import cmath
import json
import math
import sys


def face(upper, lower, index_upper, index_lower, polarisation):
    """Reflectance of a face from the normal components of the wave on both sides."""
    if polarisation == "p":
        upper, lower = upper * index_lower**2, lower * index_upper**2
    return abs((upper - lower) / (upper + lower)) ** 2


def beams(problem, design, n, k, w, angle_deg, polarisation):
    """R, T and the absorptance of every layer at one wavelength for one polarisation."""
    layers = [l for l, d in enumerate(design["thicknessNm"]) if d != 0]
    media = [problem["incidentMaterial"]]
    media += [design["material"][l] for l in layers]
    media.append(problem["exitMaterial"])
    index = [complex(n[m][w], k[m][w]) for m in media]
    along = index[0].real * math.sin(math.radians(angle_deg))
    normal = [cmath.sqrt(i * i - along * along) for i in index]
    passes = [1.0] * len(media)
    for j, l in enumerate(layers, start=1):
        if index[j].imag > 0:
            per_nm = 4 * math.pi / problem["wavelengthNm"][w] * normal[j].imag
            passes[j] = math.exp(-per_nm * design["thicknessNm"][l])
    faces = [
        face(normal[j], normal[j + 1], index[j], index[j + 1], polarisation)
        for j in range(len(media) - 1)
    ]
    # From the bottom up: what each medium sees when it looks down.
    below = [0.0] * len(media)
    for j in reversed(range(len(faces))):
        around = passes[j + 1] ** 2 * below[j + 1]
        through = (1 - faces[j]) ** 2 * around
        below[j] = faces[j] + (through / (1 - faces[j] * around) if through else 0.0)
    # From the top down: what arrives.
    absorptance = [0.0] * len(design["thicknessNm"])
    arriving = 1.0
    for j in range(len(faces)):
        around = passes[j + 1] ** 2 * below[j + 1]
        entering = arriving * (1 - faces[j])
        entering = entering / (1 - faces[j] * around) if entering else 0.0
        if j == len(faces) - 1:
            return below[0], entering, absorptance
        returning = entering * passes[j + 1] * below[j + 1]
        absorptance[layers[j]] = (entering + returning) * (1 - passes[j + 1])
        arriving = entering * passes[j + 1]


def evaluate(problem, design, n, k):
    answer = {"reflectance": [], "transmittance": [], "absorptance": []}
    for incidence in problem["incidences"]:
        asked = incidence["polarisation"]
        parts = ["s", "p"] if asked == "unpolarised" else [asked]
        rows = []
        for w in range(len(problem["wavelengthNm"])):
            each = [beams(problem, design, n, k, w, incidence["angleDeg"], p) for p in parts]
            flat = [[r, t] + a for r, t, a in each]
            rows.append([sum(values) / len(parts) for values in zip(*flat)])
        columns = [list(column) for column in zip(*rows)]
        answer["reflectance"].append(columns[0])
        answer["transmittance"].append(columns[1])
        answer["absorptance"].extend(columns[2:])
    return answer


def refusal(problem):
    if problem["options"]:
        return "two_beam.py takes no options; leave them out"
    if any(incidence["side"] != "front" for incidence in problem["incidences"]):
        return "two_beam.py takes light from the front only; use another solver for that"
    return None


def main():
    problem = n = k = None
    for line in sys.stdin:
        request = json.loads(line)
        answer = {"id": request["id"]}
        if request["request"] == "prepare":
            problem = request["problem"]
            n, k = request["start"]["n"], request["start"]["k"]
            reason = refusal(problem)
            answer.update({"unsupported": reason} if reason else {"ready": True})
        else:
            answer["answers"] = []
            for design in request["designs"]:
                for row in design["rows"]:
                    n[row["material"]], k[row["material"]] = row["n"], row["k"]
                answer["answers"].append(evaluate(problem, design, n, k))
        print(json.dumps(answer), flush=True)


if __name__ == "__main__":
    main()
