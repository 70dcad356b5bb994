#!/usr/bin/env bash
# Points a second of `scan` over those of NumPy, in one run on one machine. Wants Python with NumPy
# and target/rankfall.jar; the heap of the program is held to 96 MB.
#
#   src-test/rankfall/bench/scan-ratio.sh
set -euo pipefail
cd "$(dirname "$0")/../../.."

points_a_second() { # reads "..., N points, ..., S s"
  awk '{ for (k = 2; k <= NF; k++) { if ($k ~ /^points/) n = $(k - 1); if ($k == "s") s = $(k - 1) }
         if (s == 0) exit 1
         printf "%.0f\n", n / s }'
}

numpy=$(python3 src-test/rankfall/bench/signatures.py 100 | tail -n 1 | sed 's/ s,.*/ s/' | points_a_second)
spec=specs/kinematics-ten.yaml
scan() { java -Xmx96m -jar target/rankfall.jar scan "$spec" --threads 2 "$@" 2>&1 >/dev/null | points_a_second; }
counted=$(scan --grid a=-2:2:465,b=-2:2:465,m=-2:2:465 --count)
table=$(mktemp -d)
trap 'rm -rf "$table"' EXIT
written=$(scan --grid a=-2:2:215,b=-2:2:215,m=-2:2:215 --out "$table/points.csv")

echo "NumPy: $numpy points a second"
echo "scan --count over 10^8 points: $counted a second, $((counted / numpy)) times as many"
echo "scan --out over 10^7 points: $written rows a second"
