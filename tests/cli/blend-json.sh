bluecone blend --json 90 g20 10 hydrogen --within "$SRC/examples/contract-gb-gsmr-2025.ini" |
    sed -n '1,12p; /"limits"/,/"checks"/p; /"verdict"/p; /"id": "recipe"/,/"rows"/p'
