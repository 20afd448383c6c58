# One case, its air stated in every way: the same figures.
bluecone burn --excess 17.3 --csv g20 >first.csv
dry=$(sed -n 's/^flue-o2-dry,[^,]*,\([^,]*\),.*/\1/p' first.csv)
wet=$(sed -n 's/^flue-o2-wet,[^,]*,\([^,]*\),.*/\1/p' first.csv)
for air in '--excess 17.3' '--excess 17.3%' '--lambda 1.173' "--flue-o2 $dry" "--flue-o2 ${dry}dry" "--flue-o2 ${dry}%dry" "--flue-o2 ${wet}wet"; do
    # shellcheck disable=SC2086 # an option and its value
    bluecone burn $air --csv --digits 7 g20 | sed -n '/^oxidant-supplied,/p; /^flue-o2/p; /^flame-temperature,/p; /^efficiency-net/p' | cut -d, -f3 | tr '\n' ' '
    # shellcheck disable=SC2086
    bluecone burn $air g20 | sed -n 's/^  air factor lambda *//p'
done
