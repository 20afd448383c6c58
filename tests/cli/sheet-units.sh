# A sheet in kilowatt hours at the state of the contract.
cp "$SRC/examples/present-supply.ini" .
bluecone sheet --at 25/0 --unit kWh/Nm3,kWh/kg,kWh/kmol --digits 5 present-supply.ini
