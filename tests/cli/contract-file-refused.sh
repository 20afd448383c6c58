# what a contract file cannot mean
try() { printf "%b" "$1" >c.ini; bluecone contract c.ini g20 >out.txt; echo $?; }
try '[contract]\nfollows = nowhere\n[limit hhv]\nmin = 3\n'
try '[contract]\nuntil = soon\n[limit hhv]\nmin = 3\n'
try '[contract]\nannual_energy = 3 m3\n[limit hhv]\nmin = 3\n'
try '[contract]\nannual_energy = 3 GWh\nannual_volume = 3 m3\n[limit hhv]\nmin = 3\n'
try '[contract]\nprice = 3 EUR/MWh\ncurrency = GBP\n[limit hhv]\nmin = 3\n'
try '[contract]\nfollows = c.ini\n[limit hhv]\nmin = 3\n'
try '[limit hhv]\nmin = 3\nbasis = mass\n'
try '[limit hydrogen]\nmax = 3\nbasis = weight\n'
try '[limit hydrogen]\nmax = 3\nedition = 2020\n'
try '[limit wobbe-ratio]\nmin = 0.95\n'
sed -n '/^Limits/,/^$/p' out.txt
# words of the trade are led to the id they stand for, gross and net; what no composition tells is said to be none
for word in GCV NCV Hu Hs PCI CV 'specific gravity' 'Wobbe index' 'water dew point' methne; do try "[limit $word]\nmin = 3\n"; done
bluecone get NCV g20; echo $?
# a share that cannot be is a unit that was forgotten
try '[limit hydrogen sulphide]\nmax = 500\n'
try '[limit hydrogen]\nmin = -1\nmax = 5\n'
try '[limit hydrogen]\nmax = 120\nbasis = mass\n'
try '[limit inerts]\nmax = 5\n[range methane]\nmin = 820\n'
try '[limit hydrogen sulphide]\nmax = 500\nunit = ppm\n'
try '[contract]\nprice = 1e300 EUR/MWh\n[limit hhv]\nmin = 3\n'
try ''
try '; nothing\n'
