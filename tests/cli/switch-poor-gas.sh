# Gases rich in carbon monoxide: told as poison, and outside of nearly everything.
for gas in blast-furnace-gas coke-oven-gas producer-gas-wood; do
    bluecone switch pipeline-h $gas | sed -n "/^Methods that could/,/^$/p; /^Warnings/,/^Caution/p"
done
