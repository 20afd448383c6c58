# Wrong air and oxidants: each with its cause.
refused() {
    bluecone burn "$@" g20
    echo "exit $?" >&2
}
refused --excess 10 --lambda 1.1
refused --flue-o2 3 --excess 10
refused --flue-o2 21
refused --flue-o2 21wet
refused --flue-o2 -1
refused --flue-o2 3moist
refused --flue-o2 3,5
refused --flue-o2 20.9
refused --lambda 0.1
refused --lambda 31
refused --lambda nan
refused --lambda 1.1x
refused --excess -80
refused --excess ten
refused --oxidant oxygen:40
refused --oxidant oxygen:101
refused --oxidant oxygen:
refused --oxidant oxygen95
refused --oxidant enriched
refused --oxidant enriched:15
refused --oxidant enriched:28x
refused --oxidant nitrogen=79,argon=21
refused --oxidant methane=100
refused --oxidant oxygen=20,nitrogen=70
refused --oxidant missing.ini
refused --humidity 160%
refused --humidity -3%
refused --humidity wet
refused --humidity 60g
refused --humidity dew:30C
refused --humidity dew:120C
refused --humidity wet-bulb:40C
refused --humidity 60% --oxidant-temp 400
