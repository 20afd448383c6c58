# A chart is of the shares, with or without --blend-in: limits, crossings and the axis are said in it.
bluecone switch "$SRC/examples/present-supply.ini" hydrogen --burner "$SRC/examples/boiler.ini" -o shares.svg --quiet
echo "exit $?"
grep -c '<svg' shares.svg
for word in 'broken from 15.39 %' 'not covered from' 'share of the new gas' 'Burning velocity' 'Oxygen of the dry flue gas' 'max 6.5' 'min 1.8' \
    'Verdict: the burner does not take' 'Old gas: Present supply' 'New gas: Hydrogen'; do
    grep -c "$word" shares.svg | sed "s/^/$word: /"
done
