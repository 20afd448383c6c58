# limits, results and verdict as one object
bluecone contract en437-2h methane=97~0.1,nitrogen=rest --json
