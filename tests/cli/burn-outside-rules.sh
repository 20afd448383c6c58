# Where the rules of flammability and burning velocity end, a warning stands instead of a figure.
for gas in hydrogen=62,methane=38 methane=91,hydrogen-sulfide=9 methanol=100 g30 methane=4,nitrogen=96; do
    echo "$gas"
    bluecone burn $gas | sed -n '/^In air/,/^$/p; /^Warnings/,/^$/p'
done
