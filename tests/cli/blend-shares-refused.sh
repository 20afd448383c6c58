for shares in '80 g20' 'g20 80 g25 20' '80 g20 20' '80x g20 20 g25' '-- -5 g20 rest g25' 'rest g20 rest g25' '60 g20 50 g25 rest g30' '0 g20 0 g25' \
    '0..30/5 g20 70 g25' '0..30 g20 0..5 g25 rest g30' '30..0 g20 rest g25' '0..30/0 g20 rest g25' '0..a g20 rest g25' '0..120 g20 rest g25' \
    'free g20 70 g25' 'free g20 free g25' '0..9 g20 free g25 rest g30'; do
    # shellcheck disable=SC2086 # the words of a command line
    bluecone blend $shares
    echo $? >&2
done
