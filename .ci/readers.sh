#!/usr/bin/env bash
# Reads one written set with independent readers and fails on any complaint. Installs nothing.
#   needs: gerbv, xmllint, rsvg-convert, /usr/bin/python3 with ezdxf and shapely, java
#   node readers too, where their modules are: npm install in .ci/readers, or NODE_READERS=DIR with
#   a node_modules folder in it
# usage: readers.sh DIR [DPI]
set -uo pipefail
here=$(cd "$(dirname "$0")/readers" && pwd)
dir=${1:?usage: readers.sh DIR [DPI]}
# gerbv rounds a pen to whole pixels: at 2000 dpi a track of 0.16 mm is 3 % too wide. Here a pixel is
# 0.01 mm, and the usual widths are whole.
dpi=${2:-2540}
python=/usr/bin/python3
out=$(mktemp -d)
trap 'rm -rf "$out"' EXIT
bad=0
complain() { echo "$dir: $*"; bad=1; }
step() { "$@" >"$out/log" 2>&1 || { cat "$out/log"; complain "FAILED: $(basename "$1") $(basename "$2")"; }; }

for tool in gerbv xmllint rsvg-convert java "$python"; do
  command -v "$tool" >/dev/null || { complain "$tool is not installed"; exit 1; }
done

# gerbv always exits 0: judge its words and its image. It reports every X2 command as unknown; any
# other word is a complaint. It sizes the image by the ends of arcs, not by how far they bulge, so
# give it a border.
render() { # FILE DPI
  local png="$out/$(basename "$1").png" words
  words=$(LC_ALL=C gerbv -x png -D "$2" -B 10 -b '#000000' -f '#ffffffff' -o "$png" "$1" 2>&1 |
    grep -v '^[[:space:]]*$' | grep -Ev 'Unknown RS-274X extension found %T[FAOD]%')
  [ -z "$words" ] || complain "gerbv on $(basename "$1"): $words"
  [ -s "$png" ] || complain "gerbv drew nothing of $(basename "$1")"
}
layers=()
pictures=()
for f in "$dir"/*.gbr "$dir"/*.xnc; do
  [ -e "$f" ] || continue
  if [[ $f =~ -copper-(L[0-9]+)\.gbr$ ]]; then
    render "$f" "$dpi"
    layers+=("${BASH_REMATCH[1]}")
    pictures+=("$out/$(basename "$f").png")
  else
    render "$f" 600
  fi
done
java -XX:TieredStopAtLevel=1 "$here/ImageArea.java" "$dpi" "${pictures[@]}" >"$out/areas" ||
  complain "the viewer's images cannot be measured"
paste -d ' ' <(printf '%s\n' "${layers[@]}") "$out/areas" >"$out/raster"

"$python" "$here/check_set.py" "$dir" "$out/raster" || complain "FAILED: check_set.py"
step "$python" "$here/check_gerber.py" "$dir"/*.gbr
step "$python" "$here/audit_dxf.py" "$dir"/*.dxf
step "$python" "$here/check_ipc.py" "$dir"/*.ipc
step "$python" "$here/check_job.py" "$dir"/*.gbrjob

# The fab gets the archive alone, so it must stand alone.
mkdir "$out/fab"
"$python" -m zipfile -e "$dir"/*-fab.zip "$out/fab" || complain "the archive cannot be opened"
step "$python" "$here/check_job.py" "$out/fab"/*.gbrjob

for s in "$dir"/*.svg; do
  step xmllint --noout "$s"
  step rsvg-convert -w 1000 -o "$out/picture.png" "$s"
  [ -s "$out/picture.png" ] || complain "rsvg-convert drew nothing of $(basename "$s")"
done

modules=${NODE_READERS:-$here}
if [ -d "$modules/node_modules" ]; then
  cp "$here"/*.mjs "$out/" && ln -s "$(cd "$modules" && pwd)/node_modules" "$out/node_modules"
  step node "$out/parse_gerber.mjs" "$dir"/*.gbr "$dir"/*.xnc
  step node "$out/parse_dxf.mjs" "$dir"/*.dxf
else
  echo "$dir: note: no node_modules, the node readers were left out"
fi
[ $bad = 0 ] && echo "$dir: every reader is content"
exit $bad
