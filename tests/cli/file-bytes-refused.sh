# Files that are no composition at all: each says what it is and what to do.
tell() { bluecone get hhv "$@"; echo "exit $?" >&2; }
printf '\357\273\277[components]\nmethane = 100\n' >bom.ini; tell bom.ini
printf '[components]\nmethane = 100\000\n' >nul.ini; tell nul.ini
printf '\377\376[\000c\000' >utf16.ini; tell utf16.ini
: >empty.ini; tell empty.ini
printf '; nothing but a remark\n' >remark.ini; tell remark.ini
mkdir folder.ini; tell folder.ini
tell ./missing.ini
mkfifo pipe.ini; tell pipe.ini
head -c 2000000 /dev/zero | tr '\000' x >huge.ini; tell huge.ini
{ echo '[components]'; printf 'methane = '; head -c 3000 /dev/zero | tr '\000' 9; echo; } >line.ini; tell line.ini
