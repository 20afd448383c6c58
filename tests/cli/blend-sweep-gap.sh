# Where a gas has no such figure the table has a gap.
bluecone blend 60..100/20 hydrogen rest g20 --show burning-velocity,hydrogen-carbon-ratio | sed -n '/^Share/,/^$/p'
