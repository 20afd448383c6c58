# BLUECONE_PATH names folders of further gases, searched first.
mkdir -p works/compositions
printf '[gas]\nname = Our own G 20\n[components]\nmethane = 99\nnitrogen = 1\n' >works/compositions/g20.ini
BLUECONE_PATH=$PWD/works bluecone get hhv g20 g21
BLUECONE_PATH=$PWD/works bluecone list gases g20
