# In the units of others.
bluecone switch g20 g25 --at 60F/60F@30inHg --unit Btu/ft3,F,Btu/h --burner "$SRC/examples/kiln.ini" | sed -n "/^State/p; /^On the burner/,/^What/p; /^Old gas and/,/^Flame/p"
