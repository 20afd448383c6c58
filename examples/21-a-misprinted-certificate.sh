#!/bin/sh
# Marrowfen Glass and Tile Works, step 21: what does this certificate mean?
#
# A page is headed MJ/Nm3 and names no temperatures. The composition tells what its figures would be at every state of
# the trade; one of them explains all that is printed, and it is not the normal cubic metre.
set -eu
cd "$(dirname "$0")"
PATH=$PATH:../build/release # a bluecone that was installed goes first

bluecone contract contract-marrowfen.ini misprinted-certificate.ini --quiet | sed -n '/^Which/,/^Verdict/p' | sed '/^Verdict/d'
