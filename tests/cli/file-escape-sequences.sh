# Control characters in names do not reach the terminal.
printf '[gas]\nname = \033[31mred\007\n[components]\nmethane = 100\n' >red.ini
bluecone get hhv red.ini
echo "exit $?" >&2
esc=$(printf '\033[31m')
bluecone get hhv "$esc=100"
bluecone get "$esc" g20
bluecone get hhv "$esc.ini"
bluecone "$esc"
bluecone list "$esc"
bluecone get hhv --unit "$esc" g20
bluecone get hhv --at "$esc/15" g20
bluecone verify "$esc"
bluecone get "--$esc" hhv g20
bluecone list states "$esc"
bluecone list areas "$esc"
