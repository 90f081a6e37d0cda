"""Packs the anomaly atlas of TEOS-10 from its CSV into the resource that WaterMix.Core embeds.

    python3 make_saar_resource.py saar_grid.csv ../../../src/WaterMix.Core/Seawater/saar_atlas.bin.gz

Values are kept bit for bit. The file is gzip around, all little-endian:
    3 int32           number of longitudes, latitudes and pressures
    doubles           the longitudes, the latitudes, the pressures
    1 byte a column   levels in the column (0: none given), longitudes outermost, then latitudes
    8 planes          the values longitude by longitude, latitude by latitude, down the column, NaN where there is none;
                      first the lowest byte of every value, then the next ones (bytes of one place compress well together)
"""
import csv
import gzip
import struct
import sys


def main(source, target):
    with open(source, encoding="utf-8", newline="") as stream:
        rows = list(csv.reader(line for line in stream if not line.startswith("#")))
    header, body = rows[0], rows[1:]
    pressures = [float(name[1:]) for name in header[3:]]
    longitudes = [4.0 * i for i in range(91)]
    latitudes = [-86.0 + 4.0 * j for j in range(45)]
    columns = {(float(r[0]), float(r[1])): r for r in body}
    assert len(columns) == len(body) and all(lon in longitudes and lat in latitudes for lon, lat in columns)

    nan = struct.pack("<d", float("nan"))
    levels, values = bytearray(), []
    for lon in longitudes:
        for lat in latitudes:
            row = columns.get((lon, lat), ["", "", ""] + [""] * len(pressures))
            levels.append(int(row[2]) if row[2] else 0)
            values += [struct.pack("<d", float(text)) if text else nan for text in row[3:]]

    parts = [struct.pack("<3i", len(longitudes), len(latitudes), len(pressures))]
    parts += [struct.pack("<d", v) for v in longitudes + latitudes + pressures]
    parts += [bytes(levels)]
    parts += [bytes(v[place] for v in values) for place in range(8)]
    with open(target, "wb") as stream:
        stream.write(gzip.compress(b"".join(parts), 9, mtime=0))


if __name__ == "__main__":
    main(sys.argv[1], sys.argv[2])
