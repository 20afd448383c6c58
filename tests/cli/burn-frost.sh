# Below 0 C the water would be ice: it is counted as vapour, and that is said.
bluecone burn --flue-temp -7.5 g20 | sed -n '/^Dew/,/^$/p; /^Losses/,/^$/p; /^Warnings/,/^$/p'
