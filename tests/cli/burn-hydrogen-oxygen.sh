# Hydrogen in pure oxygen, condensing: there is no dry flue gas, and nothing leaves as gas.
bluecone burn --oxidant oxygen --flue-temp 61 hydrogen=100 | sed -n '/^Flue gas, complete/,/^Losses/p; /^Flue gas comp/,$p'
