# All limits kept: exit 0 and the nearest limit.
bluecone blend 95 pipeline-lean 5 hydrogen --within "$SRC/examples/contract-marrowfen.ini" | sed -n '/^Limits/,/^$/p; /^Verdict/,$p'
