# Units of the trade; what has no unit in the list keeps its own.
bluecone burn --unit F,Btu/ft3,Btu/h,lb/h,lb/ft3,kJ/kmol --duty 3MW --flue-temp 320F --pressure 14.5psi g20 | sed -n '/^Case/,/^In air/p'
