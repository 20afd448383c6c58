#!/bin/sh
# Tries Debian packages in a fresh Debian: tests/package/trial.sh FOLDER, where the packages are.
#
# mmdebstrap makes the Debian, of this machine's release, in a folder that it takes away again, with or without
# being root; what is done there stands in trial_inside.sh.
set -eu

packages=$(cd "$1" && pwd)
here=$(cd "$(dirname "$0")" && pwd)
work=$(mktemp -d)
trap 'rm -rf "$work"' EXIT
trap 'exit 2' INT TERM

release=$(sed -n 's/^VERSION_CODENAME=//p' /etc/os-release)
mkdir "$work/packages"
for package in bluecone libbluecone0 libbluecone-dev; do
    cp "$packages/${package}"_*.deb "$work/packages"
done
cp "$here/trial_inside.sh" "$work/packages"

# shellcheck disable=SC2016 # $1 is the folder that mmdebstrap tells to its hooks
mmdebstrap --quiet --variant=apt --format=null \
    --customize-hook="copy-in $work/packages /opt" \
    --customize-hook='mv "$1/opt/packages/trial_inside.sh" "$1/opt"' \
    --customize-hook='chroot "$1" sh /opt/trial_inside.sh /opt/packages' \
    "$release" /dev/null
