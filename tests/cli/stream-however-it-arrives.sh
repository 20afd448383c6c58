# A log of one row without a line end; blank lines and a header of two lines that come through a pipe piece by piece; a row
# whose quotes are torn in the middle of others.
for jobs in 1 3; do
    printf 'methane\n100' | bluecone stream --add hhv --quiet --jobs $jobs
done
{ printf '\n\n\n'; sleep 0.2; printf '"methane\n",remark\n'; sleep 0.2; printf '100,"a\nb"\n'; } | bluecone stream --add hhv --quiet
printf 'methane,nitrogen,a\n97,3,\n97,3"x","me"2:95,"eth\n97,3\n97,3,x\n' | bluecone stream --add hhv --quiet
printf '{"methane":100,"b\\"":"c"}\n{"methane":100,"b\\"":","}\n' | bluecone stream --add hhv --quiet
