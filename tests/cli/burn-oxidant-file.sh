# Recirculated flue gas as a file: wet, and not quite 100 %, which is said.
cat >recirculated.ini <<'INI'
[gas]
name     = Air with flue gas
basis    = mole
unit     = percent
moisture = as-analysed
[components]
oxygen         = 17.63
nitrogen       = 76.14
argon          =  0.91
carbon dioxide =  1.62
water          =  3.41
INI
bluecone burn --oxidant recirculated.ini --flue-o2 2.1wet --oxidant-temp 48C g20 | sed -n '/^Case/,/^Dew/p; /^Warnings/,$p'
