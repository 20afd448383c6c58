# Units that do not exist, do not fit, or that half of the trade reads otherwise.
bluecone get hhv --unit MBtu/scf --at 60F/60F g20
echo "exit $?" >&2
bluecone get hhv --unit Btu/scf g20
echo "exit $?" >&2
bluecone get hhv --unit kWh/Nm3 g20
echo "exit $?" >&2
bluecone get hhv --unit kwh/m3 g20
echo "exit $?" >&2
bluecone get hhv --unit MJ/kg g20
echo "exit $?" >&2
bluecone get z --unit C g20
echo "exit $?" >&2
bluecone get hhv --unit MJ/ g20
echo "exit $?" >&2
bluecone get hhv --unit '' g20
echo "exit $?" >&2
bluecone get lhv --unit kWh g20
echo "exit $?" >&2
