# Readings in each unit, and at another reference oxygen.
bluecone burn --flue-o2 4.1 --reading nox=64ppm,nox=131.39mg/m3,nox=139.9mg/m3ref,nox=39.2mg/MJ,co=31ppm,co=31mg/m3ref,SO2=3.3ppm,so2=2mg/MJ g20 | sed -n '/^Readings/,/^$/p'
bluecone burn --flue-o2 14.2wet --reading nox=23.5ppm --reference-o2 15 g20 | sed -n '/^Readings/,/^$/p'
