# what cannot be asked
bluecone contract gb-gsmr-2052 g20; echo $?
bluecone contract gb-gsmr-2025 --traps; echo $?
bluecone contract gb-gsmr-2025 g20 --coverage 40; echo $?
bluecone contract gb-gsmr-2025 g20 --coverage much; echo $?
bluecone contract gb-gsmr-2025 g20 g21 --printed hhv=3MJ/m3; echo $?
bluecone contract gb-gsmr-2025 g20 --printed hhv; echo $?
bluecone contract gb-gsmr-2025 g20 --printed hvh=3MJ/m3; echo $?
bluecone contract gb-gsmr-2025 g20 --printed hhv=3MJ/kg; echo $?
bluecone contract gb-gsmr-2025 g20 --printed hhv=1e-320MJ/m3; echo $?
bluecone contract gb-gsmr-2025 g20 --at 0/0; echo $?
bluecone contract gb-gsmr-2025 g20 --unit=kWh/m3; echo $?
bluecone contract; echo $?
