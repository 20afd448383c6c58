# The same change of gas in three burners of the works.
for burner in boiler kiln engine; do
    bluecone switch "$SRC/examples/present-supply.ini" "$SRC/examples/new-supply-offer.ini" --burner "$SRC/examples/$burner.ini" --quiet | sed -n "/^Criteria/,/^Verdict/p"
done
