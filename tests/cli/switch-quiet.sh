# No warnings; the caution stays.
bluecone switch g20 hydrogen-blend-20 --quiet | sed -n "/^Checks/,\$p"
