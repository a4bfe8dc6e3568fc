#!/bin/sh
# Writes an invented project of many beams with five loads each, in three combinations:
#     sh make_large_project.sh FOLDER BEAM_COUNT
set -eu
if [ $# -ne 2 ]; then
    echo "usage: sh make_large_project.sh FOLDER BEAM_COUNT" >&2
    exit 2
fi
mkdir -p "$1"
awk -v folder="$1" -v count="$2" '
# A small linear congruential sequence: the same project from every awk.
function draw(from, to) {
    seed = (seed * 1103 + 12345) % 1000003
    return from + (to - from) * seed / 1000003
}
BEGIN {
    OFS = ","
    beams = folder "/beams.csv"
    loads = folder "/loads.csv"
    seed = 1
    split("pinned pinned fixed free free fixed fixed pinned pinned fixed fixed fixed", ends, " ")
    print "mark,left,right,span,E,I,limit" > beams
    print "mark,case,kind,size,size_to,from,to" > loads
    for (i = 1; i <= count; ++i) {
        kind = i % 6
        left = ends[2 * kind + 1]
        right = ends[2 * kind + 2]
        feet = i % 4 == 3
        unit = feet ? "ft" : "m"
        L = feet ? draw(8, 20) : draw(2.4, 6)
        span = sprintf("%.3f %s", L, unit)
        if (feet) print "B" i, left, right, span, "29000 ksi", sprintf("%.0f in4", draw(8000, 12000)), "L/360" > beams
        else print "B" i, left, right, span, "210 GPa", sprintf("%.0f cm4", draw(300000, 500000)), "L/300" > beams
        P = feet ? "kip" : "kN"
        w = P "/" unit
        C = P "*" unit
        end = left == "free" ? "right" : "left"
        print "B" i, "dead", "uniform", sprintf("%.2f %s", draw(1, 6), w), "", "", "" > loads
        print "B" i, "live", "point", sprintf("%.2f %s", draw(5, 20), P), "", sprintf("%.3f %s", draw(0.1, 0.9) * L, unit), "" > loads
        print "B" i, "live", "uniform", sprintf("%.2f %s", draw(1, 9), w), "", sprintf("%.3f %s", draw(0, 0.3) * L, unit), \
            sprintf("%.3f %s", draw(0.4, 0.9) * L, unit) > loads
        print "B" i, "snow", "linear", sprintf("%.2f %s", draw(0, 3), w), sprintf("%.2f %s", draw(0, 3), w), \
            sprintf("%.3f %s", draw(0, 0.4) * L, unit), sprintf("%.3f %s", draw(0.5, 0.9) * L, unit) > loads
        if (i % 2) print "B" i, "live", "couple", sprintf("%.2f %s", draw(-5, 5), C), "", sprintf("%.3f %s", draw(0, 0.9) * L, unit), "" > loads
        else print "B" i, "dead", "settlement", sprintf("%.1f mm", draw(0, 3)), "", end, "" > loads
    }
}'
cat > "$1/combinations.csv" <<'END'
combination,case,factor
dead + live,dead,1.0
dead + live,live,1.0
dead + snow,dead,1.0
dead + snow,live,0.7
dead + snow,snow,1.0
long term,dead,1.0
long term,live,0.3
long term,snow,0.2
END
