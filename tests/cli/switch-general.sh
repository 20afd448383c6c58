# Two natural gases, burners in general: the whole report.
cd "$SRC/examples" && bluecone switch present-supply.ini new-supply-offer.ini --no-color
echo "exit $?"
