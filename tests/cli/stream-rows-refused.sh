# rows without results stay, with the reason; the others are as they would be alone
cat >log.csv <<'LOG'
id,methane,ethane,nitrogen
good,95,3,2
sum,50,3,2
word,n/a,3,2
negative,95,-3,8
few,95,3
many,95,3,2,1
empty,95,,5
nothing,,,
below,95,<0.01,5
quote,"95,3,2
huge,1e400,3,2
spaces, 95 , 3 , 2
exponent,9.5e1,3,2
trailing,95,3,2,,
LOG
bluecone stream --add hhv --digits 6 log.csv; echo "exit $?" >&2
bluecone stream --add hhv --quiet --strict log.csv; echo "exit $?" >&2
printf 'methane,nitrogen\n50,1\n' | bluecone stream --add hhv; echo "exit $?" >&2
printf 'methane,nitrogen\n' | bluecone stream --add hhv; echo "exit $?" >&2
