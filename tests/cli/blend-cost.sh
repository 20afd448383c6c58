# What a blend of stated shares costs, with the CO2 of its making; what lacks is told, and nothing is passed over.
cost() { bluecone blend "$@" | sed -n '/^Cost/,/^$/p; /has no/,/--/p; /^  - No cost/,/currency/p; /^  - Shares/p'; }
cost 5 propane rest biomethane --price propane=70EUR/MWh,2=61EUR/MWh --co2 1=9kg/MWh,2=18kg/MWh
cost 5 propane rest biomethane --price propane=70EUR/MWh
cost 5 propane rest biomethane --price propane=70EUR/MWh,2=61USD/MWh
cost free propane rest biomethane --aim wobbe-gross=50.2MJ/m3 --price propane=70EUR/MWh,2=61EUR/MWh
# A fifth or a fifth of a per cent?
cost 0.2 hydrogen rest biomethane
