# Two natural gases, burners in general: the whole report.
bluecone switch "$SRC/examples/present-supply.ini" "$SRC/examples/new-supply-offer.ini" --no-color
echo "exit $?"
