# Two aims, three free shares, one fixed.
bluecone blend --by volume 2 nitrogen=100 free hydrogen free propane rest g20 --aim 'wobbe-gross=50MJ/m3,relative-density=0.56' |
    sed -n '/^Solutions/,/^Heat/p; /^Verdict/,/^Caution/p'
