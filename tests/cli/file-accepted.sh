# What a certificate from elsewhere may bring: CRLF, blanks, remarks, capitals, ppm, fractions.
printf '[gas]\r\nname = From Windows\r\n[components]\r\nmethane = 92\r\nethane = 8\r\n' >crlf.ini
printf '  [ components ]\n  Methane=92 ; as printed\n\tETHANE\t=\t8\n' >loose.ini
printf '[gas]\nunit = fraction\n[components]\nmethane = .92\nethane = 8 %%\n' >fraction.ini
printf '[gas]\nunit = ppm\n[components]\nmethane = 92 %%\nethane = 80000\n' >ppm.ini
printf '[components]\nmethane = 92\nethane = 8' >no-newline.ini
for file in crlf loose fraction ppm no-newline; do
    bluecone get hhv --quiet $file.ini
done
