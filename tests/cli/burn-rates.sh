# One fire, its size stated in every way: the same rows.
size() { sed -n "s/^$1,[^,]*,\([^,]*\),.*/\1/p" first.csv; }
air='--flue-o2 3 --flue-temp 160 --casing-loss 1'
# shellcheck disable=SC2086 # options and their values
bluecone burn --rate 317kg/h $air --csv g20 >first.csv
# shellcheck disable=SC2086
bluecone burn --rate 317kg/h $air g20 | sed -n '/^Rates/,/^$/p' | tee first.txt
for size in 'rate 0.0880555555556kg/s' "rate $(size fuel-volume-rate)m3/h" 'rate 19.7600617362kmol/h' "duty $(size duty)kW" "duty $(size duty | awk '{ printf "%.9f", $1 / 1000 }')MW"; do
    # shellcheck disable=SC2086
    bluecone burn --$size $air g20 | sed -n '/^Rates/,/^$/p' | cmp - first.txt && echo "the same by ${size%% *}"
done
