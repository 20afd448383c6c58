#!/usr/bin/env python3
"""A log on a cluster of Apache Spark: rdd.pipe of bluecone stream.

    spark_pipe.py [--master URL] [--parts N] [--by PERIOD] LOG ROWS SUMMARY -- OPTION...

LOG      CSV with a header, at a place that all workers see; --step among the options
ROWS     the rows with their figures, header first, as `bluecone stream --rows-alone` writes them
SUMMARY  the summary as `bluecone stream --rows-alone --summary` prints it
OPTION   of bluecone stream, for rows and summary alike: --add, --contract, --step, --at ...

bluecone is installed on every worker. Without --master it is a local cluster: a master and two workers, each with an
executor of its own, as processes of this machine.

Rows are parted by lines, which tears a quoted cell that holds a line feed: a log with such cells is no work for an
engine that parts by lines. Lines come out with line feeds, also where the log has carriage returns.
"""
import argparse
import os
import shlex
import shutil
import subprocess
import sys
import tempfile

from pyspark import SparkConf, SparkContext

LOCAL_CLUSTER = "local-cluster[2,1,512]"  # workers, cores each, MiB each
MERGE_AT_ONCE = 64  # parts that one --merge takes
ANSWERED = (0, 1)  # 1: rows are outside of the contract


def take_arguments(words):
    options = []
    if "--" in words:
        at = words.index("--")
        words, options = words[:at], words[at + 1:]
    parser = argparse.ArgumentParser(description=__doc__.splitlines()[0])
    parser.add_argument("--master", default=LOCAL_CLUSTER)
    parser.add_argument("--parts", type=int, default=8)
    parser.add_argument("--by", choices=("hour", "day", "month"))
    for name in ("log", "rows", "summary"):
        parser.add_argument(name)
    return parser.parse_args(words), options


def open_cluster(master):
    conf = SparkConf().setAppName("bluecone stream").setMaster(master)
    conf.set("spark.executor.memory", "512m").set("spark.ui.enabled", "false")
    conf.set("spark.ui.showConsoleProgress", "false")
    # The workers of a local cluster are on this machine; nobody else need reach them.
    conf.set("spark.driver.host", "localhost").set("spark.driver.bindAddress", "127.0.0.1")
    return SparkContext(conf=conf)


def piped(lines, *words):
    """The lines of each partition through a bluecone of its own. Exit status 1 is an answer, not a failure."""
    command = ["sh", "-c", '"$@" || test $? -eq 1', "sh", shutil.which("bluecone"), "stream", *words]
    return lines.pipe(shlex.join(command), checkCode=True)


def without_header(lines):
    """The header stands first in the first partition."""
    return lines.mapPartitionsWithIndex(lambda i, part: (line for k, line in enumerate(part) if i > 0 or k > 0),
                                        preservesPartitioning=True)


def bluecone(*words, text=None):
    done = subprocess.run(["bluecone", "stream", *words], input=text, stdout=subprocess.PIPE, text=True)
    if done.returncode not in ANSWERED:
        sys.exit(f"bluecone stream {' '.join(words)}: exit status {done.returncode}")
    return done.stdout


def write_rows(rows, header, path, folder):
    """One file a partition, in the order of the partitions, which is that of the log."""
    parts = os.path.join(folder, "rows")
    rows.saveAsTextFile("file://" + parts)
    with open(path, "wb") as whole:
        whole.write(header.encode())
        for name in sorted(name for name in os.listdir(parts) if name.startswith("part-")):
            with open(os.path.join(parts, name), "rb") as part:
                shutil.copyfileobj(part, whole)


def merge(parts, folder):
    """Parts, a line of JSON each, become greater parts until one --merge takes them all."""
    def written(lines, round_number):
        names = [os.path.join(folder, f"part.{round_number}.{i}.json") for i in range(len(lines))]
        for name, line in zip(names, lines):
            with open(name, "w", encoding="utf-8") as file:
                file.write(line + "\n")
        return names

    round_number = 0
    while len(parts) > MERGE_AT_ONCE:
        names = written(parts, round_number)
        parts = [bluecone("--merge", "--summary-part", *names[i:i + MERGE_AT_ONCE]).rstrip("\n")
                 for i in range(0, len(names), MERGE_AT_ONCE)]
        round_number += 1
    return bluecone("--merge", "--quiet", *written(parts, round_number))


def main():
    arguments, options = take_arguments(sys.argv[1:])
    with open(arguments.log, encoding="utf-8") as log:
        names, first = log.readline().rstrip("\r\n"), log.readline()
    header = bluecone("--rows-alone", "--quiet", *options, text=f"{names}\n{first}").splitlines()[0] + "\n"
    common = ["--no-header", "--columns", names, "--rows-alone", "--quiet", *options]
    summed = [*common, "--summary-part", *(["--by", arguments.by] if arguments.by else [])]

    cluster = open_cluster(arguments.master)
    cluster.setLogLevel("ERROR")
    lines = without_header(cluster.textFile("file://" + os.path.abspath(arguments.log), arguments.parts))
    with tempfile.TemporaryDirectory() as folder:
        write_rows(piped(lines, *common), header, arguments.rows, folder)
        parts = piped(lines, *summed).collect()
        with open(arguments.summary, "w", encoding="utf-8") as summary:
            summary.write(merge(parts, folder))
    executors = cluster._jsc.sc().getExecutorMemoryStatus().size() - 1  # the driver is counted, too
    print(f"{lines.getNumPartitions()} parts, {executors} workers")
    cluster.stop()


if __name__ == "__main__":
    main()
