# Lack of air: equilibrium, carbon monoxide, another caution.
bluecone burn --excess -12.5 pipeline-h
echo "exit $?"
