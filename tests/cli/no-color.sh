# Colour never reaches a file or a pipe.
bluecone sheet g20 | grep -c "$(printf '\033')"
bluecone sheet g20 >plain.txt
NO_COLOR=1 bluecone sheet g20 | cmp - plain.txt && echo the same
bluecone sheet --no-color g20 | cmp - plain.txt && echo the same
