# bluecone: settings, sources, rules, targets. `make help` lists the targets.
#
# One makefile for every way of building: VARIANT picks the flags and the folder build/$(VARIANT), so
# objects of different variants never mix. Shell calls stand in `=` variables and run only inside
# recipes: this file also parses on a machine that has nothing but make (see `deps`).

# ---- settings: all may be given on the command line -----------------------------------------------
VARIANT = release
WERROR  =
V       = @
PREFIX  = /usr/local
SECONDS = 60

prefix      = $(PREFIX)
exec_prefix = $(prefix)
bindir      = $(exec_prefix)/bin
libdir      = $(exec_prefix)/lib
includedir  = $(prefix)/include
datarootdir = $(prefix)/share
datadir     = $(datarootdir)
mandir      = $(datarootdir)/man
docdir      = $(datarootdir)/doc/bluecone
pkgconfigdir      = $(libdir)/pkgconfig
bashcompletiondir = $(datadir)/bash-completion/completions
DESTDIR =

INSTALL         = install
INSTALL_PROGRAM = $(INSTALL) -m 755
INSTALL_DATA    = $(INSTALL) -m 644
PKG_CONFIG      = pkg-config

ifeq ($(origin CC),default)
CC := $(if $(filter clang fuzz,$(VARIANT)),clang,gcc)
endif
CXX = g++
# ---- end of settings ------------------------------------------------------------------------------

SHELL := /bin/sh
MAKEFLAGS += --no-builtin-rules --no-print-directory
.SUFFIXES:
.DELETE_ON_ERROR:
.SECONDARY:
.PHONY: FORCE all deps deps-build deps-test deps-lint deps-bench deps-coverage deps-cross deps-dist deps-deb check crosscheck run-tests \
        sanitize clang fuzz faults valgrind demo bench lint metrics symbols thread run-threads coverage mutation install uninstall dist deb clean help

OUT       := build/$(VARIANT)$(if $(WERROR),-werror)
VERSION    = $(shell sed -n 's/^.define BC_VERSION "\(.*\)"/\1/p' include/bluecone/status.h)
SOVERSION := 0

DEPS_BUILD := gcc libc6-dev make pkg-config libiniparser-dev libjansson-dev libcairo2-dev libxlsxwriter-dev libnlopt-dev libcsv-dev
DEPS_TEST  := $(DEPS_BUILD) g++ binutils libcmocka-dev mandoc groff-base locales universal-ctags libxml2-utils unzip parallel python3 \
              git xz-utils libsqlite3-dev sqlite3
DEPS_CROSS := $(DEPS_BUILD) python3 python3-venv chromium openjdk-17-jre-headless time
DEPS_BENCH := $(DEPS_BUILD) mawk miller libsqlite3-dev sqlite3
DEPS_COVERAGE := $(DEPS_TEST) gcovr
DEPS_DIST  := git tar xz-utils coreutils
DEPS_DEB   := $(DEPS_BUILD) $(DEPS_DIST) libsqlite3-dev dpkg-dev debhelper fakeroot lintian mmdebstrap
DEPS_LINT  := $(DEPS_TEST) clang clang-tidy cppcheck shellcheck pmccabe valgrind

# ---- flags ----------------------------------------------------------------------------------------
WARNINGS := -Wall -Wextra -Wpedantic -Wshadow -Wconversion -Wsign-conversion -Wdouble-promotion \
    -Wstrict-prototypes -Wmissing-prototypes -Wold-style-definition -Wvla -Wcast-qual -Wcast-align \
    -Wwrite-strings -Wformat=2 -Wundef -Wswitch-enum -Wnull-dereference $(if $(WERROR),-Werror)
HARDENING = -fstack-protector-strong -fstack-clash-protection -ftrivial-auto-var-init=pattern \
    $(if $(filter x86_64% i%86%,$(shell $(CC) -dumpmachine 2>/dev/null)),-fcf-protection)
FORTIFY   = $(if $(filter -O0,$(CFLAGS)),,-U_FORTIFY_SOURCE -D_FORTIFY_SOURCE=3)

CFLAGS.release  = -O2 -g $(FORTIFY) $(HARDENING)
CFLAGS.clang    = $(CFLAGS.release) -Wno-unused-command-line-argument
CFLAGS.sanitize = -O1 -g -fsanitize=address,undefined -fno-sanitize-recover=all -fno-omit-frame-pointer
CFLAGS.thread   = -O1 -g -fsanitize=thread
CFLAGS.coverage = -O0 -g --coverage -fprofile-update=atomic
INSTRUMENTS    := $(filter -fsanitize=% --coverage,$(CFLAGS.$(VARIANT)))
CFLAGS.fuzz     = -O1 -g -fsanitize=fuzzer-no-link,address,undefined -fno-sanitize-recover=all -fno-omit-frame-pointer

CFLAGS_ALL   = -std=c11 $(WARNINGS) $(CFLAGS.$(VARIANT)) -fvisibility=hidden -fno-common -ffp-contract=off \
               -fno-math-errno "-ffile-prefix-map=$(CURDIR)=." $(CFLAGS)
CPPFLAGS_ALL = -D_POSIX_C_SOURCE=200809L -I include -I src $(CPPFLAGS)
LDFLAGS_ALL  = -Wl,-z,relro,-z,now,-z,noexecstack,--as-needed $(LDFLAGS)
# NLopt is loaded when an optimum is asked for: only its header is needed here.
LDLIBS_LIB  := -liniparser -lm -ldl
NLOPT        = $(shell $(PKG_CONFIG) $1 nlopt 2>/dev/null)
# The modules for charts and workbooks, and what they have in common with the program.
CAIRO        = $(shell $(PKG_CONFIG) $1 cairo cairo-pdf cairo-svg 2>/dev/null)
XLSXWRITER   = $(shell $(PKG_CONFIG) $1 xlsxwriter 2>/dev/null)
JANSSON      = $(shell $(PKG_CONFIG) $1 jansson 2>/dev/null)
SQLITE       = $(shell $(PKG_CONFIG) $1 sqlite3 2>/dev/null)
CMOCKA       = $(shell $(PKG_CONFIG) $1 cmocka 2>/dev/null)

# What one object is compiled with; MODE and EXTRA depend on where its source lives.
MODE     = -fPIE
COMPILE  = $(CC) $(CPPFLAGS_ALL) $(EXTRA) $(CFLAGS_ALL) $(MODE)
LINK     = $(CC) $(CFLAGS_ALL) -fPIE -pie $(LDFLAGS_ALL)

# ---- sources --------------------------------------------------------------------------------------
LIB_DIRS    := $(wildcard $(addprefix src/,base gas value flame supply))
LIB_SRC     := $(sort $(wildcard $(LIB_DIRS:%=%/*.c)))
CHART_SRC   := $(sort $(wildcard src/output/chart_draw*.c))
BOOK_SRC    := $(sort $(wildcard src/output/book*.c))
SQL_SRC     := $(sort $(wildcard src/sqlite/*.c))
PROGRAM_SRC := $(sort $(filter-out $(CHART_SRC) $(BOOK_SRC),$(wildcard src/output/*.c src/cli/*.c)))
TEST_SRC    := $(sort $(wildcard tests/*/test_*.c))
HEADERS     := $(sort $(wildcard include/bluecone/*.h))
COMPOSITIONS := $(sort $(wildcard compositions/*.ini))
SPECIFICATIONS := $(sort $(wildcard compositions/specifications/*.ini))
MAN_PAGES   := $(sort $(wildcard man/*.[1-9]))
HEADER_PAGES := $(patsubst include/bluecone/%.h,$(OUT)/man/bluecone_%.3,$(filter-out %/bluecone.h,$(HEADERS)))
EXAMPLES     = $(shell find examples -type f 2>/dev/null | LC_ALL=C sort)
SCRIPTS     := $(sort .ci/run .ci/deps .package/dist .package/deb $(wildcard tests/*.sh tests/*/*.sh examples/*.sh examples/*/*.sh))

LIB_OBJ     := $(LIB_SRC:%.c=$(OUT)/%.o)
PROGRAM_OBJ := $(PROGRAM_SRC:%.c=$(OUT)/%.o)
CHART_OBJ   := $(CHART_SRC:%.c=$(OUT)/%.o)
CHART_TOO   := $(addprefix $(OUT)/src/,base/digits.o output/memory_stream.o base/text.o output/number_text.o output/plain_text.o output/text_letter.o)
BOOK_OBJ    := $(BOOK_SRC:%.c=$(OUT)/%.o)
BOOK_TOO    := $(CHART_TOO) $(addprefix $(OUT)/src/output/,report_judged.o result_text.o section.o)
# Only where SQLite's headers are: the one question that is asked before any recipe, and "no" without pkg-config.
SQL         := $(if $(shell $(PKG_CONFIG) --exists sqlite3 2>/dev/null && echo yes),$(OUT)/bluecone_sqlite.so)
SQL_OBJ     := $(SQL_SRC:%.c=$(OUT)/%.o)
PROGRAM_PARTS := $(filter-out %/cli/main.o,$(PROGRAM_OBJ))
# The house rules judge the released library; the other variants carry their instruments.
TESTS       := $(filter-out $(if $(filter release,$(VARIANT)),,%/house/test_house) $(if $(SQL),,%/sqlite/test_sqlite),$(TEST_SRC:%.c=$(OUT)/%))
RUNNER      := $(OUT)/tests/house/run_all
# The interposer takes the place of malloc(), as sanitizers do.
FAULTS      := $(if $(filter release clang,$(VARIANT)),$(OUT)/tests/faults/faults $(OUT)/tests/faults/inject.so)
RUN_FAULTS   = bash tests/faults/run.sh -b $(OUT)
# A fuzz target replays its seeds in the tests; in the variant `fuzz` libFuzzer drives it.
FUZZ_SRC    := $(sort $(wildcard tests/fuzz/fuzz_*.c))
FUZZERS     := $(FUZZ_SRC:%.c=$(OUT)/%)
FUZZ_DRIVER  = $(if $(filter fuzz,$(VARIANT)),-fsanitize=fuzzer,$(OUT)/tests/fuzz/replay.o)
REPLAYS      = $(foreach f,$(FUZZERS),'$f tests/fuzz/seeds/$(patsubst fuzz_%,%,$(notdir $f))')
PROGRAM     := $(OUT)/bluecone
ARCHIVE     := $(OUT)/libbluecone.a
SHARED      := $(OUT)/libbluecone.so.$(SOVERSION)
PC_FILES    := $(OUT)/bluecone.pc $(OUT)/bluecone-uninstalled.pc
CHART       := $(OUT)/bluecone_chart.so
BOOK        := $(OUT)/bluecone_workbook.so
COMPLETION  := $(if $(wildcard src/cli/completion.bash.in),$(OUT)/bluecone.bash)

all: $(PROGRAM) $(CHART) $(BOOK) $(SQL) $(ARCHIVE) $(SHARED) $(OUT)/libbluecone.so $(PC_FILES) $(HEADER_PAGES) $(COMPLETION) ## build the program and the library (default)
	@echo '$(PROGRAM) is ready'

# ---- rules ----------------------------------------------------------------------------------------
$(LIB_OBJ) $(CHART_OBJ) $(BOOK_OBJ) $(BOOK_TOO) $(SQL_OBJ): private MODE = -fPIC
$(OUT)/src/output/%.o: private EXTRA = $(call JANSSON,--cflags) -DBC_LIB_DIR='"$(libdir)"'
$(OUT)/src/supply/%.o: private EXTRA = $(call NLOPT,--cflags)
$(CHART_OBJ):          private EXTRA = $(call CAIRO,--cflags)
$(BOOK_OBJ):           private EXTRA = $(call XLSXWRITER,--cflags)
$(SQL_OBJ):            private EXTRA = $(call SQLITE,--cflags) $(call JANSSON,--cflags) -DBC_DATA_DIR='"$(datadir)/bluecone"'
$(OUT)/src/cli/%.o:    private EXTRA = $(call JANSSON,--cflags) -DBC_DATA_DIR='"$(datadir)/bluecone"'
$(OUT)/tests/%.o:      private EXTRA = $(call CMOCKA,--cflags) -I tests \
                               -DBC_SOURCE_DIR='"$(CURDIR)"' -DBC_BUILD_DIR='"$(CURDIR)/$(OUT)"'

# Changes only when the flags or folders do, so `make install PREFIX=/usr` never installs a program
# that was built for another place.
FLAGS = $(COMPILE) $(LDFLAGS_ALL) $(prefix) $(libdir) $(includedir) $(datadir)
$(OUT)/flags: FORCE
	@mkdir -p $(@D)
	@printf '%s\n' '$(subst ','\'',$(FLAGS))' >$@.now; cmp -s $@.now $@ || cp $@.now $@

$(OUT)/%.o: %.c Makefile $(OUT)/flags
	@mkdir -p $(@D)
	@echo '  CC    $<'
	$(V)$(COMPILE) -MMD -MP -c $< -o $@

# The folders are prerequisites so that a source that was removed leaves the archive, too.
$(ARCHIVE): $(LIB_OBJ) $(LIB_DIRS)
	@echo '  AR    $@'
	@mkdir -p $(@D) && rm -f $@
	$(V)$(AR) rcsD $@ $(LIB_OBJ)

$(SHARED): $(LIB_OBJ)
	@echo '  LD    $@'
	$(V)$(CC) $(CFLAGS_ALL) -fPIC -shared $(LDFLAGS_ALL) -Wl,-z,defs -Wl,-soname,$(@F) $^ $(LDLIBS_LIB) -o $@

# Loaded when a chart or a workbook is asked for, so that no other answer waits for their libraries.
$(CHART): $(CHART_OBJ) $(CHART_TOO)
	@echo '  LD    $@'
	$(V)$(CC) $(CFLAGS_ALL) -fPIC -shared $(LDFLAGS_ALL) -Wl,-z,defs $^ $(call CAIRO,--libs) -lm -o $@

$(BOOK): $(BOOK_OBJ) $(BOOK_TOO)
	@echo '  LD    $@'
	$(V)$(CC) $(CFLAGS_ALL) -fPIC -shared $(LDFLAGS_ALL) -Wl,-z,defs $^ $(call XLSXWRITER,--libs) -lm -o $@

# SQLite loads it into the program of somebody else, which may have a library of its own: nothing but the entry is seen.
$(OUT)/bluecone_sqlite.so: $(SQL_OBJ) $(ARCHIVE)
	@echo '  LD    $@'
	$(V)$(CC) $(CFLAGS_ALL) -fPIC -shared $(LDFLAGS_ALL) -Wl,-z,defs -Wl,--exclude-libs,ALL $^ $(call JANSSON,--libs) $(LDLIBS_LIB) -o $@

$(PROGRAM): $(PROGRAM_OBJ) $(ARCHIVE)
	@echo '  LD    $@'
	$(V)$(LINK) $^ $(call JANSSON,--libs) $(LDLIBS_LIB) -o $@

# A test finds the modules beside itself, as the program does.
$(OUT)/tests/output/test_chart: $(OUT)/src/output/chart_draw_ticks.o $(OUT)/src/output/chart_draw_time.o \
    $(OUT)/src/output/chart_draw_range.o
$(OUT)/tests/output/test_chart $(OUT)/tests/output/test_page: | $(OUT)/tests/output/bluecone_chart.so
$(OUT)/tests/output/test_workbook: | $(OUT)/tests/output/bluecone_workbook.so
$(OUT)/tests/sqlite/test_sqlite: private TEST_LIBS = $(call SQLITE,--libs)
$(OUT)/tests/sqlite/test_sqlite: | $(SQL)
$(OUT)/tests/output/bluecone_%.so: $(OUT)/bluecone_%.so
	@mkdir -p $(@D) && ln -sf $(abspath $<) $@

$(TESTS) $(RUNNER): $(OUT)/%: $(OUT)/%.o $(PROGRAM_PARTS) $(ARCHIVE)
	@echo '  LD    $@'
	$(V)$(LINK) $^ $(call CMOCKA,--libs) $(TEST_LIBS) $(call JANSSON,--libs) $(LDLIBS_LIB) -pthread -o $@

$(OUT)/tests/faults/faults: $(OUT)/tests/faults/faults.o
	@echo '  LD    $@'
	$(V)$(LINK) $^ -o $@

$(OUT)/tests/faults/inject.o: private MODE = -fPIC -fvisibility=default
$(OUT)/tests/faults/inject.so: $(OUT)/tests/faults/inject.o
	@echo '  LD    $@'
	$(V)$(CC) $(CFLAGS_ALL) -fPIC -shared $(LDFLAGS_ALL) $^ -ldl -o $@

$(FUZZERS): $(OUT)/%: $(OUT)/%.o $(OUT)/tests/fuzz/replay.o $(PROGRAM_PARTS) $(ARCHIVE)
	@echo '  LD    $@'
	$(V)$(LINK) $< $(FUZZ_DRIVER) $(PROGRAM_PARTS) $(ARCHIVE) $(call JANSSON,--libs) $(LDLIBS_LIB) -o $@

# The second is what pkg-config takes when it looks into a build folder: programs there find the library that
# was just built. A library with instruments in it needs programs that have them, too.
$(OUT)/bluecone.pc:             private PC = -e 's|@prefix@|$(prefix)|' -e 's|@libdir@|$(libdir)|' -e 's|@includedir@|$(includedir)|' \
                                             -e 's|@compositions@|$(datadir)/bluecone/compositions|'
$(OUT)/bluecone-uninstalled.pc: private PC = -e 's|@prefix@|$(CURDIR)|' -e 's|@libdir@|$(CURDIR)/$(OUT)|' -e 's|@includedir@|$(CURDIR)/include|' \
                                             -e 's|@compositions@|$(CURDIR)/compositions|'
$(PC_FILES): src/bluecone.pc.in include/bluecone/status.h Makefile $(OUT)/flags
	@sed $(PC) -e 's|@version@|$(VERSION)|' -e 's|@instruments@|$(INSTRUMENTS:%= %)|' $< >$@

$(OUT)/libbluecone.so: $(SHARED)
	@ln -sf $(notdir $<) $@

# The pages of the headers bear the date of bluecone(3).
$(OUT)/man/bluecone_%.3: include/bluecone/%.h src/header_page.awk man/bluecone.3
	@mkdir -p $(@D)
	@awk -v date="$$(sed -n 's/^\.Dd //p' man/bluecone.3)" -f src/header_page.awk $< >$@

$(OUT)/bluecone.bash: src/cli/completion.bash.in include/bluecone/status.h Makefile
	@mkdir -p $(@D)
	@sed 's|@version@|$(VERSION)|' $< >$@

-include $(LIB_OBJ:.o=.d) $(PROGRAM_OBJ:.o=.d) $(CHART_OBJ:.o=.d) $(BOOK_OBJ:.o=.d) $(SQL_OBJ:.o=.d) $(TESTS:=.d) $(FUZZERS:=.d) $(OUT)/tests/faults/faults.d $(OUT)/tests/faults/inject.d $(RUNNER).d

# ---- targets --------------------------------------------------------------------------------------
deps: deps-lint ## install what is missing of the Debian packages used here
deps-build: ; @.ci/deps $(DEPS_BUILD)
deps-test:  ; @.ci/deps $(DEPS_TEST)
deps-lint:  ; @.ci/deps $(DEPS_LINT)
deps-bench: ; @.ci/deps $(DEPS_BENCH)
deps-coverage: ; @.ci/deps $(DEPS_COVERAGE)
deps-cross: ; @.ci/deps $(DEPS_CROSS)
deps-dist:  ; @.ci/deps $(DEPS_DIST)
deps-deb:   ; @.ci/deps $(DEPS_DEB)

# These start make again: what they build may need what `deps` has only just installed.
check: deps-test ## build with the default compiler and run every test
	@$(MAKE) run-tests
sanitize: deps-test ## the tests under AddressSanitizer and UndefinedBehaviorSanitizer
	@$(MAKE) VARIANT=sanitize run-tests
thread: deps-test ## the library in many threads at once, under ThreadSanitizer
	@$(MAKE) VARIANT=thread run-threads
run-threads: $(OUT)/tests/library/test_threads
	@TSAN_OPTIONS="suppressions=$(CURDIR)/tests/house/threads.supp:halt_on_error=1:exitcode=66" $<
# What the tests reach of src/; the counters are atomic since the stream has threads.
coverage: deps-coverage ## lines and branches that the tests reach, with the least that must be
	@$(MAKE) VARIANT=coverage run-tests
	@cd build/coverage && gcovr --root ../.. --object-directory . --filter ../../src/ --exclude-unreachable-branches --gcov-ignore-parse-errors --sort-percentage \
	    --txt coverage.txt --html-details coverage.html --print-summary --fail-under-line 95 --fail-under-branch 85 .
# Small changes of the physics, one at a time: do the tests notice? Every symbol is visible, so that the test programs
# can share a library that is linked anew for each change. An index that leaves its array ends the program, as it would
# in `make sanitize`.
WATCHED = -O1 -g0 -fvisibility=default -fsanitize=bounds -fsanitize-undefined-trap-on-error
MUTANTS = 300
SEED    = 1
mutation: deps-test ## kill MUTANTS random changes of the physics by the tests; build/mutation/report.txt
	@$(MAKE) OUT=build/mutation/base CFLAGS='$(WATCHED) $(CFLAGS)' all tests
	@SRC='$(CURDIR)' BASE=build/mutation/base MUTANTS='$(MUTANTS)' SEED='$(SEED)' PYTHONDONTWRITEBYTECODE=1 \
	    COMPILE='$(COMPILE) -fPIC $(WATCHED) $(call NLOPT,--cflags)' LINKER='$(CC)' LINK_LIB='$(LDLIBS_LIB)' \
	    LINK_TEST='$(call CMOCKA,--libs) $(call JANSSON,--libs) $(LDLIBS_LIB) -pthread' python3 tests/mutation/run.py
clang: deps-lint ## the program, the library and the test programs, by Clang with -Werror
	@$(MAKE) VARIANT=clang WERROR=1 all tests
fuzz: deps-lint ## every fuzz target by libFuzzer, SECONDS=60 each; FUZZ=stream: that one alone
	@$(MAKE) VARIANT=fuzz fuzzers
	@bash tests/fuzz/run.sh -b build/fuzz $(SECONDS) $(FUZZ)
faults: deps-test ## calls of the C library fail one after the other, in every command; thousand hostile inputs
	@$(MAKE) all tests
	@$(RUN_FAULTS) 400
	@$(IN_BUILD) bash tests/faults/hostile.sh -b $(OUT) 1000
valgrind: deps-lint ## every command once under Valgrind
	@$(MAKE) all
	@$(IN_BUILD) bash tests/faults/valgrind.sh -b $(OUT)
demo: deps-build ## build, then play the examples
	@$(MAKE) all
	$(if $(wildcard examples/demo.sh),@$(IN_BUILD) bash examples/demo.sh)
crosscheck: deps-cross ## compare with reference libraries from PyPI, pinned
	@$(MAKE) all
	@$(IN_BUILD) CC='$(CC)' bash tests/crosscheck/run.sh

bench: deps-bench ## build, then measure
	@$(MAKE) all
	$(if $(wildcard tests/bench/run.sh),@$(IN_BUILD) bash tests/bench/run.sh)

# How scripts find the source tree and the program just built.
IN_BUILD = SRC="$(CURDIR)" PATH="$(CURDIR)/$(OUT):$$PATH" \
    $(if $(filter sanitize,$(VARIANT)),LSAN_OPTIONS="suppressions=$(CURDIR)/tests/house/leaks.supp:print_suppressions=0")

.PHONY: tests fuzzers
fuzzers: $(FUZZERS)
tests: $(TESTS) $(FUZZERS) $(FAULTS) $(RUNNER)
run-tests: all tests
	@$(IN_BUILD) CC='$(CC)' CXX='$(CXX)' $(RUNNER) $(TESTS) $(REPLAYS) 'tests/run_cli.sh -b $(OUT)' \
	    $(if $(FAULTS),'$(RUN_FAULTS) 5 daily') 'bash tests/faults/hostile.sh -b $(OUT) 12' \
	    $(if $(SQL),'bash tests/sqlite/run.sh') $(if $(wildcard tests/docs/run.sh),'bash tests/docs/run.sh') 'bash tests/library/run.sh $(OUT)' \
	    'bash tests/package/run.sh'

# One file a run: Clang-tidy 14 takes va_list for uninitialised in every file but the first.
lint: deps-lint ## cppcheck, clang-tidy, mandoc and shellcheck
	cppcheck --quiet --std=c11 --enable=warning,performance,portability --inline-suppr --error-exitcode=1 \
	    --suppress=missingIncludeSystem -D_POSIX_C_SOURCE=200809L '-DBC_DATA_DIR=""' -I include -I src src
	printf '%s\n' $(LIB_SRC) $(PROGRAM_SRC) $(CHART_SRC) $(BOOK_SRC) $(if $(SQL),$(SQL_SRC)) | xargs -P 4 -I FILE \
	    clang-tidy --quiet FILE -- -std=c11 $(CPPFLAGS_ALL) $(call CAIRO,--cflags) '-DBC_DATA_DIR=""'
	$(if $(MAN_PAGES),mandoc -T lint -W warning $(MAN_PAGES))
	@$(MAKE) -s $(HEADER_PAGES)
	mandoc -T lint -W warning $(HEADER_PAGES)
	shellcheck $(filter-out tests/cli/%,$(SCRIPTS))
	$(if $(filter tests/cli/%,$(SCRIPTS)),shellcheck --shell=sh $(filter tests/cli/%,$(SCRIPTS)))

metrics: deps-lint ## the figures of our own source beside their targets
	@$(MAKE) $(ARCHIVE) >/dev/null
	@SRC="$(CURDIR)" OUT="$(CURDIR)/$(OUT)" COMPILE='$(COMPILE)' bash tests/house/metrics.sh

symbols: all ## accept the exported symbols and the binary interface as they are now
	@mkdir -p tests/abi
	@nm -D --defined-only --format=posix $(SHARED) | awk '{ print $$1 }' | LC_ALL=C sort >tests/abi/symbols
	@SRC="$(CURDIR)" WORK="$(OUT)" CC='$(CC)' sh tests/house/interface.sh print >$(OUT)/interface.now
	@cp $(OUT)/interface.now tests/abi/interface

install: all ## copy everything below PREFIX (and DESTDIR)
	$(INSTALL) -d $(foreach d,$(bindir) $(libdir)/bluecone $(pkgconfigdir) $(includedir)/bluecone \
	    $(datadir)/bluecone/compositions/specifications $(docdir) $(bashcompletiondir),"$(DESTDIR)$d")
	$(INSTALL_PROGRAM) $(PROGRAM) "$(DESTDIR)$(bindir)/bluecone"
	$(INSTALL_DATA) $(ARCHIVE) $(SHARED) "$(DESTDIR)$(libdir)"
	$(INSTALL_DATA) $(CHART) $(BOOK) $(SQL) "$(DESTDIR)$(libdir)/bluecone"
	ln -sf $(notdir $(SHARED)) "$(DESTDIR)$(libdir)/libbluecone.so"
	$(INSTALL_DATA) $(OUT)/bluecone.pc "$(DESTDIR)$(pkgconfigdir)"
	$(INSTALL_DATA) $(HEADERS) "$(DESTDIR)$(includedir)/bluecone"
	$(if $(COMPLETION),$(INSTALL_DATA) $(COMPLETION) "$(DESTDIR)$(bashcompletiondir)/bluecone")
	$(if $(COMPOSITIONS),$(INSTALL_DATA) $(COMPOSITIONS) "$(DESTDIR)$(datadir)/bluecone/compositions")
	$(if $(SPECIFICATIONS),$(INSTALL_DATA) $(SPECIFICATIONS) "$(DESTDIR)$(datadir)/bluecone/compositions/specifications")
	for f in $(MAN_PAGES) $(HEADER_PAGES); do $(INSTALL_DATA) -D $$f "$(DESTDIR)$(mandir)/man$${f##*.}/$${f##*/}" || exit 1; done
	for f in $(wildcard README.md) $(EXAMPLES); do $(INSTALL_DATA) -D $$f "$(DESTDIR)$(docdir)/$$f" || exit 1; done

# Folders are removed only when they are ours and empty.
uninstall: ## remove what install put there
	rm -f "$(DESTDIR)$(bindir)/bluecone" "$(DESTDIR)$(pkgconfigdir)/bluecone.pc" "$(DESTDIR)$(bashcompletiondir)/bluecone" \
	    $(foreach f,libbluecone.a libbluecone.so $(notdir $(SHARED)) bluecone/$(notdir $(CHART)) bluecone/$(notdir $(BOOK)) bluecone/bluecone_sqlite.so,"$(DESTDIR)$(libdir)/$f") \
	    $(HEADERS:include/%="$(DESTDIR)$(includedir)/%") $(foreach f,$(COMPOSITIONS) $(SPECIFICATIONS),"$(DESTDIR)$(datadir)/bluecone/$f") \
	    $(foreach f,$(MAN_PAGES) $(HEADER_PAGES),"$(DESTDIR)$(mandir)/man$(subst .,,$(suffix $f))/$(notdir $f)") \
	    $(foreach f,README.md $(EXAMPLES),"$(DESTDIR)$(docdir)/$f")
	for d in "$(includedir)/bluecone" "$(libdir)/bluecone" "$(datadir)/bluecone" "$(docdir)"; do \
	    test ! -d "$(DESTDIR)$$d" || find "$(DESTDIR)$$d" -depth -type d -empty -delete; done

dist: deps-dist ## the source archive of the last commit, the same bytes every time
	@.package/dist build $(VERSION)

deb: deps-deb dist ## Debian packages from that archive, judged by lintian, tried in a fresh Debian
	@.package/deb build $(VERSION) $(DEPS_BUILD) libsqlite3-dev
	@tests/package/trial.sh build/deb

clean: ## remove build/
	rm -rf build

help: ## this list
	@awk -F ':.*## ' '/^[a-z]+:.*## / { printf "  make %-10s %s\n", $$1, $$2 }' Makefile
	@echo '  VARIANT=release|clang|sanitize|thread|coverage  WERROR=1  V= (show commands)  PREFIX=  DESTDIR='
