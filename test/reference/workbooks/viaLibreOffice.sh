#!/usr/bin/env bash
# Writes libreOffice.xlsx (openpyxl.xlsx opened and saved: function names in small letters, values kept) and libreOfficeUnknown.xlsx (saved as
# .ods on the way: worked out anew by a program that doesn't know our functions, so that their cells hold #NAME?).
set -eu
cd "$(dirname "$0")"
scratch="$(mktemp -d)"
trap 'rm -rf "$scratch"' EXIT
convert() { soffice --headless "-env:UserInstallation=file://$scratch/profile" --convert-to "$1" --outdir "$scratch/$1" "$2"; }
convert xlsx openpyxl.xlsx
convert ods openpyxl.xlsx
cp "$scratch/xlsx/openpyxl.xlsx" libreOffice.xlsx
convert xlsx "$scratch/ods/openpyxl.ods"
cp "$scratch/xlsx/openpyxl.xlsx" libreOfficeUnknown.xlsx
