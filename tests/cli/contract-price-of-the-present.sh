# the present supply at its own price, in the same and in another currency
printf '[contract]\nprice = 30 EUR/MWh\nannual_volume = 1e6 Nm3\nat = 25/0\n[limit hhv]\nmin = 3\n' >c.ini
for price in '0.35 EUR/m3' '0.30 GBP/m3'; do
    printf '[gas]\nname = Present\n[components]\nmethane = 100\n[supply]\nprice = %s\n' "$price" >present.ini
    bluecone contract c.ini pipeline-h --against present.ini | sed -n '/^Against/,$p'
done
