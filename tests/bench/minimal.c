/* SPDX-License-Identifier: MIT */
/* minimal.c - the baseline of the start benchmark: load an INI file with iniparser, print one number. */
#include <iniparser/iniparser.h>
#include <stdio.h>

int main(int argc, char **argv)
{
    dictionary *ini = argc > 1 ? iniparser_load(argv[1]) : NULL;

    if (!ini)
        return 1;
    printf("%.6g MJ/m3\n", iniparser_getdouble(ini, "components:methane", 0.0));
    iniparser_freedict(ini);
    return 0;
}
