# Limits with margins and verdicts, dangers as checks, the verdict.
bluecone switch g20 g25 --json | sed -n "/\"limits\"/,\$p"
