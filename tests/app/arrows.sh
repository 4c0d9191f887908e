#!/bin/sh
# Fails if a folder of core includes from one that comes after it: outcome, units ← gas ← path ← analysis ← document.
# usage: arrows.sh CORE-FOLDER
set -eu
status=0
later=''
for room in document analysis path gas; do
    later="$later $room"
    for earlier in outcome units gas path analysis; do
        case "$later" in *" $earlier"*) continue ;; esac
        if grep -rn "#include \"core/$room/" "$1/$earlier"; then
            echo "core/$earlier must not include core/$room"
            status=1
        fi
    done
done
exit $status
