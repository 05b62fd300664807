#!/usr/bin/env bash
# usage: build/declare-public-api.sh <project.csproj>
# Appends every undeclared public symbol (RS0016) to PublicAPI/<target>/PublicAPI.Unshipped.txt.
set -euo pipefail
project=$1
folder=$(dirname "$project")
for target in netstandard2.0 net10.0; do
  api="$folder/PublicAPI/$target"
  mkdir -p "$api"
  for kind in Shipped Unshipped; do
    [ -f "$api/PublicAPI.$kind.txt" ] || printf '#nullable enable\n' > "$api/PublicAPI.$kind.txt"
  done
  log=$(mktemp --suffix=.sarif)
  dotnet build "$project" -f "$target" --no-incremental -v q "-p:ErrorLog=$log%2Cversion=2.1" -p:TreatWarningsAsErrors=false >/dev/null || true
  python3 - "$log" "$api/PublicAPI.Unshipped.txt" <<'PY'
import json, sys
log, unshipped = sys.argv[1:]
results = json.load(open(log, encoding="utf-8-sig"))["runs"][0]["results"]
lines = {line for line in open(unshipped, encoding="utf-8-sig").read().splitlines() if line and not line.startswith("#")}
lines |= {r["properties"]["customProperties"]["APIName"] for r in results if r["ruleId"] == "RS0016"}
open(unshipped, "w", encoding="utf-8", newline="\n").write("\n".join(["#nullable enable", *sorted(lines)]) + "\n")
PY
  rm -f "$log"
done
