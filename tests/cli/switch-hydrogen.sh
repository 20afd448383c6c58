# Hydrogen blend: most indices end at 10 %, what covers it leads; a danger that nobody judges is no yes.
bluecone switch g20 hydrogen-blend-20
echo "exit $?"
