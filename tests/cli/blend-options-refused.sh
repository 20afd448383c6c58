refused() { bluecone blend "$@"; echo $? >&2; }
refused 50 g20 50 g25 --by weight
refused 50 g20 50 g25 --least cost
refused 50 g20 50 g25 --aim hhv=30
refused 50 g20 50 g25 --show hhv
refused 50 g20 50 g25 --flow 5MW
refused 50 g20 50 g25 --max-flow 1=5MW
refused 50 g20 50 g25 --price 1=30EUR/MWh --price 2=20EUR/MWh
refused 0..5 g20 rest g25 --price 1=30EUR/MWh
refused free g20 free g25 --aim hhv=30,wobbe-gross=40
refused free g20 free g25 --aim hhv
refused free g20 free g25 --aim hhb=30
refused free g20 free g25 --aim hhv=x
refused free g20 free g25 --aim hhv=30MJ/kg
refused free g20 free g25 --least price
refused free g20 free g25 --least share:g30
refused free g20 free g25 --least cost
refused free g20 free g25 --least cost --price 1=30EUR/MWh,2=3GBP/MWh
refused free g20 free g25 --least cost --price g31=30EUR/MWh
refused free g20 free g25 --least cost --price 1=EUR
refused free g20 free g25 --least cost --flow 5kg
refused 0..5 g20 rest g25 --show hhv,hvh
refused 0..5 g20 rest g25 --show hhv --unit MJ/kg
refused 50 air 50 g25 --by energy
refused 50 g20 50 g25 --within nowhere.ini
