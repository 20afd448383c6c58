# A locale with a decimal comma changes nothing, neither in nor out.
# Where the machine has no such locale one is made here (package locales), else C is as good.
localedef -i de_DE -f UTF-8 ./de_DE.UTF-8 >/dev/null 2>&1
LOCPATH=$PWD LC_ALL=de_DE.UTF-8 LANG=de_DE.UTF-8
export LOCPATH LC_ALL LANG
bluecone get hhv --quiet methane=92.5,ethane=7.5
bluecone get hhv --csv methane=92.5,ethane=7.5
bluecone get hhv methane=92,5,ethane=7,5
