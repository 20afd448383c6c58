# Every published value: the count and the verdict. An unknown area is refused.
bluecone verify | tail -n 16
bluecone verify en473
