# A picture, told aside of its state unless --quiet; a name without an ending that gives a form is refused.
bluecone blend 0..30/5 hydrogen rest pipeline-h --within "$SRC/examples/contract-marrowfen.ini" -o sweep.svg --quiet
head -c 5 sweep.svg
echo
bluecone blend 0..30/5 hydrogen rest pipeline-h -o sweep.bmp
