# LPG with air of nearly the same Wobbe index: yellow tips are judged by nobody.
bluecone switch pipeline-h lpg-air | sed -n "/^Interchangeability/,/^Heat/p; /^Criteria/,\$p"
