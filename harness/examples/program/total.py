"""A program as a candidate for sums, in Python 3: the correctly rounded sum of math.fsum."""

import math
import sys


def main():
    lines = (line.split() for line in sys.stdin)
    greeting = next(lines)
    if greeting[:2] != ["steelyard", "1"]:
        sys.exit("this program speaks version 1")
    print("steelyard 1", flush=True)
    for header in lines:
        problem = header[1]
        count = int(next(lines)[2])
        terms = [float.fromhex(next(lines)[0]) for _ in range(count)]
        next(lines)
        try:
            print(f"answer {problem} 1\n{math.fsum(terms).hex()}", flush=True)
        except OverflowError as wrong:
            print(f"error {problem} {wrong}", flush=True)


main()
