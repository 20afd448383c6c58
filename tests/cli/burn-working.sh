# The textbook case: methane with twice its volume of oxygen at 2 atm, products at 1000 K, every term.
bluecone burn --working --oxidant oxygen --pressure 2atm --flue-temp 1000K methane=100 >textbook.txt
sed -n '/^Case/,/^Oxidant /p; /^Enthalpy path/,/^$/p; /^Working: terms/,/^Caution/p' textbook.txt
