# Burner files that are refused, each with file, line and remedy.
try() { printf "%b" "$1" >b.ini; bluecone switch g20 g25 --burner b.ini; echo "exit $?" >&2; }
try "[burner]\ntype = premix\n"
try "[burner]\ntype = candle\ncontrol = fixed\n"
try "[burner]\ntype = premix\ncontrol = fixed\nimput = 3 MW\n"
try "[burner]\ntype = premix\ncontrol = fixed\ninput = 3\n"
try "[burner]\ntype = premix\ncontrol = fixed\n[air]\nexcess = 10\nlambda = 1.1\n"
try "[burner]\ntype = premix\ncontrol = fixed\n[air]\ntrim_range = 10\n"
try "[burner]\ntype = premix\ncontrol = fixed\n[chimney]\nheight = 10\n"
try "[burner]\ntype = atmospheric\ncontrol = entrained\n[air]\nlambda = 1.1\nprimary = 150\n"
try "[burner]\ntype = premix\ncontrol = fixed\n[air]\nflue_o2 = 19.9\no2_basis = wet\n[limits]\no2_min = 9\no2_max = 3\n"
try "[burner]\ntype = premix\ncontrol = fixed\norifice = 3 mm\norifices = 1.5\n"
try "[burner]\ntype = premix\nlambda = 1.2\n"
try "[burner]\ntype = premix\ntemperature = 20 C\n"
try ""
try "type = premix\n"
bluecone switch g20 g25 --burner missing.ini
echo "exit $?" >&2
