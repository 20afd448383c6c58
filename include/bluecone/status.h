/* SPDX-License-Identifier: MIT */
/* bluecone/status.h - how every function of the library answers, and what it says when it cannot.
 *
 * A function that can fail returns a bc_status and writes its outputs only on BC_OK. Where the
 * cause is known it also fills the caller's bc_error with a finished sentence: cause, then remedy. */
#ifndef BLUECONE_STATUS_H
#define BLUECONE_STATUS_H

#ifdef __cplusplus
extern "C" {
#endif

#if defined(__GNUC__)
#define BC_API __attribute__((visibility("default")))
#define BC_MUST_USE __attribute__((warn_unused_result))
#else
#define BC_API
#define BC_MUST_USE
#endif

/* What came of a call. The exit code of the command line that follows from each is bc_exit_code(). */
typedef enum {
    BC_OK = 0,
    BC_ERR_USAGE,  /* a word, unit or option that does not exist or does not fit: exit 2 */
    BC_ERR_RANGE,  /* a value outside the range of the method asked for: exit 2 */
    BC_ERR_INPUT,  /* bad input data: exit 3 */
    BC_ERR_FILE,   /* a file or device failed: exit 4 */
    BC_ERR_MEMORY, /* no memory: exit 4 */
    BC_ERR_SOLVER  /* a solution could not be found: exit 3 */
} bc_status;

#define BC_FILE_MAX 512    /* bytes of a file name kept in an error, with the final NUL */
#define BC_MESSAGE_MAX 512 /* bytes of the sentence, with the final NUL */

/* An error as the caller keeps it; all text is copied in and always terminated. */
typedef struct {
    bc_status status;
    char file[BC_FILE_MAX];       /* "" when no file is to blame */
    int line;                     /* 1 is the first line; 0 when no line is to blame */
    char message[BC_MESSAGE_MAX]; /* cause and remedy */
} bc_error;

/* The exit code of the command line for a status: 0, 2, 3 or 4. */
BC_API int bc_exit_code(bc_status status);

/* A short English noun phrase for a status ("bad input data"); never NULL. */
BC_API const char *bc_status_text(bc_status status);

/* The version of the library that runs, "MAJOR.MINOR.PATCH"; a program built earlier may differ
 * from BC_VERSION. */
BC_API const char *bc_version(void);
#define BC_VERSION "0.1.0"

#ifdef __cplusplus
}
#endif

#endif
