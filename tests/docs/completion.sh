#!/bin/bash
# The completion of bash, asked as the shell asks it; silent when all is well. Wants bluecone in PATH.
set -u
SRC=$(cd "$(dirname "$0")/../.." && pwd) || exit 2
work=$(mktemp -d) || exit 2
trap 'rm -rf "$work"' EXIT
cd "$work" && mkdir folder && : >sample.ini && : >other.txt && : >log.csv || exit 2

# shellcheck disable=SC1091 # made by the build from this source
source "$SRC/src/cli/completion.bash.in"

# offered LINE: what is offered at its end, sorted, on one line; words broken at = : @ as bash does.
offered() {
    local broken
    COMP_LINE=$1
    COMP_POINT=${#1}
    broken=$(printf '%s' "$1" | sed 's/[=:@]/ & /g')
    read -ra COMP_WORDS <<<"$broken"
    COMPREPLY=()
    _bluecone 2>/dev/null
    printf '%s\n' "${COMPREPLY[@]}" | LC_ALL=C sort | tr '\n' ' ' | sed 's/ $//'
}

# expect LINE WORDS
expect() {
    local got
    got=$(offered "$1")
    test "$got" = "$2" || printf '%s\n  offers: %s\n  wanted: %s\n' "$1" "$got" "$2"
}

# holds LINE WORD...: these are among what is offered.
holds() {
    local line=$1 got word
    got=" $(offered "$line") "
    shift
    for word; do
        case $got in *" $word "*) ;; *) printf '%s\n  does not offer %s\n' "$line" "$word" ;; esac
    done
}

holds 'bluecone ' blend burn get list sheet switch verify help --help --version
expect 'bluecone help sw' 'switch'
expect 'bluecone help switch ' ''
expect 'bluecone sh' 'sheet'
expect 'bluecone sw' 'switch'
expect 'bluecone get wobbe-g' 'wobbe-gross wobbe-gross-ideal'
expect 'bluecone get hhv,relative-density-' 'hhv,relative-density-ideal'
holds 'bluecone get hhv ' g20 pipeline-h folder/ sample.ini
expect 'bluecone get hhv g2' 'g20 g21 g23 g25'
expect 'bluecone get hhv samp' 'sample.ini'
expect 'bluecone get hhv oth' ''
expect 'bluecone get hhv methane=92,ethan' '92,ethane= 92,ethanol='
expect 'bluecone get hhv methane=92,res' '92,rest'
expect 'bluecone get hhv methane=9' ''
expect 'bluecone get hhv mass:isob' 'isobutane= isobutene='
expect 'bluecone get hhv neopen' 'neopentane='
expect 'bluecone get hhv g20 g11' 'g110'
expect 'bluecone get --at 25' '25/0 25/20'
expect 'bluecone get hhv g20 --at 60F/60F@1' '14.73psi'
expect 'bluecone get --edition ' '1995 2016'
expect 'bluecone get hhv g20 --unit MW' 'MW MWh'
expect 'bluecone get hhv g20 --unit kJ/mol,kWh/Nm' 'kJ/mol,kWh/Nm3'
expect 'bluecone get --at 25/0 wobbe-n' 'wobbe-net wobbe-net-ideal'
holds 'bluecone sheet g20 -o ' other.txt folder/
expect 'bluecone sheet --wor' '--working'
expect 'bluecone sheet --ba' ''
expect 'bluecone blend ' 'free rest'
holds 'bluecone blend 20 ' g20 hydrogen folder/ sample.ini
expect 'bluecone blend 20 hydrogen r' 'rest'
expect 'bluecone blend 20 hydrogen rest methane=92,ethan' '92,ethane= 92,ethanol='
expect 'bluecone blend --by ' 'energy mass mole volume'
expect 'bluecone blend --least s' 'share:'
expect 'bluecone blend --show hhv,wobbe-g' 'hhv,wobbe-gross hhv,wobbe-gross-ideal'
expect 'bluecone blend --within samp' 'sample.ini'
expect 'bluecone blend --aim hhv=39MJ/m3,wobbe-gross-' '39MJ/m3,wobbe-gross-ideal='
holds 'bluecone burn ' g20 pipeline-h folder/ sample.ini
expect 'bluecone burn g20 g2' ''
holds 'bluecone switch ' g20 hydrogen folder/ sample.ini
expect 'bluecone switch g20 g2' 'g20 g21 g23 g25'
expect 'bluecone switch g20 g21 g2' ''
expect 'bluecone switch --burner sam' 'sample.ini'
expect 'bluecone switch --ble' '--blend-in'
expect 'bluecone burn --flue-' '--flue-o2 --flue-temp'
holds 'bluecone burn --oxidant ' air oxygen oxygen: enriched: sample.ini
expect 'bluecone burn --oxidant enr' 'enriched:'
expect 'bluecone burn --oxidant enriched:2' ''
expect 'bluecone burn --oxidant oxygen=20,nitroge' '20,nitrogen-dioxide= 20,nitrogen='
expect 'bluecone burn --humidity w' 'wet-bulb:'
expect 'bluecone burn --reading nox=71ppm,s' '71ppm,so2='
expect 'bluecone burn --reading nox=71ppm,co=1' ''
expect 'bluecone burn --excess 10 g20 --unit Btu/sc' 'Btu/scf'
expect 'bluecone list spec' 'species specifications'
expect 'bluecone contract gb-gsmr-2' 'gb-gsmr-2025'
holds 'bluecone contract ' gb-gsmr-2025 sample.ini folder/
expect 'bluecone contract pl-e g2' 'g20 g21 g23 g25'
expect 'bluecone contract pl-e g20 --against g2' 'g20 g21 g23 g25'
expect 'bluecone contract pl-e --log lo' 'log.csv'
expect 'bluecone contract --printed hhv=39MJ/m3,wobbe-gross-' '39MJ/m3,wobbe-gross-ideal='
expect 'bluecone list specifications pl' 'pl-e'
expect 'bluecone list species n-hexa' 'n-hexane'
expect 'bluecone list options ver' 'verify'
expect 'bluecone verify ste' 'steam'
expect 'bluecone verify steam ' ''
expect 'bluecone nonsense ' ''

# Every option of every command is offered.
for command in $(bluecone list commands --bare); do
    # shellcheck disable=SC2046 # options hold no blanks
    holds "bluecone $command -" $(bluecone list options "$command" --bare) -o
done
