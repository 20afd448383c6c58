# without a column of time there are no hours
printf '[limit hydrogen]\nmax = 10\n' >limit.ini
printf 'sample,methane,hydrogen\n1,92.1,7.9\n' >log.csv
bluecone contract limit.ini --log log.csv
