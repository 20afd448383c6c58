# Every quantity there is, asked for by its id.
for id in $(bluecone list quantities --bare); do
    printf '%-24s ' "$id"
    bluecone get "$id" --quiet pipeline-h
done
