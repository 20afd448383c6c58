# The pairs of combustion and metering temperature in use.
for state in 15/15 25/0 0/0 15/0 25/20 20/20 60F/60F 60F/60F@14.73psi 288.15K/288.15K@1013.25mbar; do
    printf '%-30s ' "$state"
    bluecone get hhv --at "$state" --quiet pipeline-h
done
