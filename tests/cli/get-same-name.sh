# two certificates from one form: the rows must tell them apart
for share in 8 10 12; do
    printf '[gas]\nname = Supply\n[components]\nethane = %s\nmethane = rest\n' $share >$share.ini
done
bluecone get hhv 8.ini 10.ini 12.ini --csv --quiet --digits 5
bluecone get hhv,lhv 8.ini 10.ini --bare
bluecone sheet --air-free 8.ini 10.ini --csv --quiet | sed -n '2,3p'
bluecone get hhv g20 g20 --quiet
