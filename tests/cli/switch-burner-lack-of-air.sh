# A rich gas on a burner set close on a lean one: carbon monoxide, and neither efficiency nor dew point.
cat >close.ini <<END
[burner]
type = premix
control = fixed
[air]
lambda = 1.08
END
bluecone switch g25 g21 --burner close.ini | sed -n "/^On the burner/,/^Old gas/p; /^Warnings/,\$p"
bluecone switch g25 g21 --burner close.ini >/dev/null
echo "exit $?"
