# Below 1227 C the flue gas of a rich flame keeps its composition; above, it does not.
for t in 300 1226 1400; do
    bluecone burn --lambda 0.81 --flue-temp $t g20 | sed -n '/^Heat with/,/^$/p; /^Flue gas as it leaves/,/^  H2 /p'
done
bluecone burn --lambda 0.3 --oxidant oxygen g20 | sed -n '/^Adiabatic/,/^$/p; /^Verdict/p'
