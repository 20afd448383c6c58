# Every published value: the count and the verdict. An unknown area is refused.
bluecone verify | sed -n '/^Checks/,$s/[0-9][0-9]* \([cv]\)/N \1/p'
bluecone verify en473
