# A chart is of the shares, with or without --blend-in: limits, crossings and the axis are said in it.
bluecone switch "$SRC/examples/present-supply.ini" hydrogen --burner "$SRC/examples/boiler.ini" -o shares.svg --quiet
echo "exit $?"
grep -c '<svg' shares.svg
for word in broken 'not covered' 'share of the new gas' 'Burning velocity' most least; do
    grep -c "$word" shares.svg | sed "s/^/$word: /"
done
