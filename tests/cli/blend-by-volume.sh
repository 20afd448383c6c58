# Real-gas volumes at the metering state, a rest, and the composition alone.
bluecone blend --by volume --at 0/0 60.5 propane rest air | sed -n '/^Recipe/,/^$/p; /^Composition/,/^$/p'
