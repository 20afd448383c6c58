# headers that no log can have
printf '[limit hydrogen]\nmax = 10\n' >limit.ini
try() {
    printf '%b' "$1" >log.csv
    bluecone contract limit.ini --log log.csv; echo "$?"
}
try ''
try '\n\n'
try 'time,methane\n'
try 'methane,hydrogen\n92.1,7.9\n'
try 'time,date,timestamp,methane\n'
try 'time,flow [kg/h]\n2026-03-01T00:00,1\n'
try 'time,methane,CH4\n'
try 'time,methane,flow\n'
try 'time,methane,flow [K]\n'
try 'time,methane,flow [kg/h],flow [m3/h]\n'
try 'time,methane [stone],ethane\n'
try 'time,C4H10,methane\n'
try 'time,methane\n2026-03-01T00:00,"100\n2026-03-01T01:00,100\n'
try 't\0i\0m\0e\0\n'
bluecone contract limit.ini --log none.csv; echo "$?"
mkdir folder.csv
bluecone contract limit.ini --log folder.csv; echo "$?"
