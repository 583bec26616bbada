#!/usr/bin/env bash
# Makes the README's pictures and its terminal sample from the filter wheel template, or, with
# --check, says which of them no longer show what the program does today.
#   needs: a built jar (or ETCHLOOM=COMMAND), python3, cmp, sha256sum; chromium, but not for --check
# The board's picture is the example's own and kept in step by ExamplesTest. A screenshot differs
# with every browser and its fonts, so the sum of the page it was taken from stands beside it.
# usage: pictures.sh [--check]
set -euo pipefail
cd "$(dirname "$0")/.."
etchloom=${ETCHLOOM:-java -jar target/etchloom.jar}
pictures=out-examples/pictures
board=out-examples/filter-wheel-drive-A/filter-wheel-drive.svg
check=${1:-}
scratch=$(mktemp -d)
trap 'rm -rf "$scratch"' EXIT
export SOURCE_DATE_EPOCH=1796083200 # as the examples have it
set=$scratch/wheel

{
  echo '```console'
  echo '$ etchloom draw templates/filter-wheel.yaml -o wheel'
  $etchloom draw templates/filter-wheel.yaml -o "$set" | sed "s|$scratch/||"
  echo '```'
} >"$scratch/terminal"
sum=$(sha256sum "$set/report.html" | cut -d ' ' -f 1)

# Between its two marks the README holds the sample; says whether that changed anything.
sample() { # write|check
  python3 - "$1" "$scratch/terminal" <<'PY'
import sys
begin, end = "<!-- terminal sample: .ci/pictures.sh -->\n", "<!-- end of sample -->"
text = open("README.md", encoding="utf-8").read()
head, rest = text.split(begin)
old, tail = rest.split(end)
new = open(sys.argv[2], encoding="utf-8").read()
if sys.argv[1] == "write":
    open("README.md", "w", encoding="utf-8").write(head + begin + new + end + tail)
elif old != new:
    sys.exit(1)
PY
}

if [ "$check" = --check ]; then
  bad=0
  cmp -s "$set/filter-wheel-drive.svg" "$board" || { echo "$board: the board is drawn otherwise today"; bad=1; }
  [ "$(cat $pictures/page.sha256)" = "$sum" ] || { echo "$pictures/page.png: the page has changed"; bad=1; }
  sample check || { echo "README.md: the terminal sample has changed"; bad=1; }
  [ $bad = 0 ] && echo "the README shows what the program does" || echo "run .ci/pictures.sh"
  exit $bad
fi

sample write
mkdir -p "$pictures"
chromium --headless=new --no-sandbox --disable-gpu --hide-scrollbars --force-color-profile=srgb \
  --window-size=1100,2055 --force-device-scale-factor=0.8 --screenshot="$scratch/page.png" "file://$set/report.html" >"$scratch/log" 2>&1
[ -s "$scratch/page.png" ] || { cat "$scratch/log"; exit 1; }
cp "$scratch/page.png" "$pictures/page.png"
echo "$sum" >"$pictures/page.sha256"
ls -l "$pictures"
