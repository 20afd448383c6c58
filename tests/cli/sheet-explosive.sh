# A gas that carries its own oxygen: a flammable mixture is named as a danger, LPG-air and landfill gas are not.
for gas in methane=12,air=88 methane=20,oxygen=80 hydrogen=50,air=50 methane=30,air=70 lpg-air landfill-gas; do
    echo "$gas: $(bluecone sheet "$gas" | grep -c DANGER)"
done
bluecone burn methane=20,oxygen=80
echo "exit $?"
bluecone get air-demand methane=20,oxygen=80
echo "exit $?"
