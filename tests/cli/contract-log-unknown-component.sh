# columns that are no component are ignored, but named; a cut is told how it was split, a component by any of its names
printf '[limit hydrogen]\nmax = 10\n[limit c4+]\nmax = 3\n' >limit.ini
printf 'time,CH4,hydrogne,H2,C6+ [ppm],Wobbe (MJ/m3),,station\n2026-03-01,95.1,0.4,4.8,900,51.2,,north\n2026-03-02,95.3,0.4,4.6,800,51.1,,"north, gate 2"\n' >log.csv
bluecone contract limit.ini --log log.csv; echo "exit $?"
