# python3 tied_pairs_scipy.py > tied_pairs_scipy.csv
import csv, platform, scipy
from scipy import stats

with open("tied_pairs.csv") as file:
    rows = list(csv.DictReader(line for line in file if not line.startswith("#")))
x = [float(row["x"]) for row in rows]
y = [float(row["y"]) for row in rows]
print(f"# From tied_pairs.csv by tied_pairs_scipy.py; scipy {scipy.__version__}, Python {platform.python_version()}.")
print("name,value")


def put(name, x, y):
    result = stats.spearmanr(x, y)
    print(f"{name},{result.statistic:.15g}\n{name}_p,{result.pvalue:.15g}")


put("tied", x, y)
put("y_one_later", x[:-1], y[1:])
put("y_two_earlier", x[2:], y[:-2])
# y up to 15 is below a limit and y from 28 on is above one: lowest and highest rank, tied
put("censored", x, [0 if v <= 15 else 99 if v >= 28 else v for v in y])
# x taken from both ends in turn: it swings where y drifts, so that no serial correlation is shared
put("swinging", [x[i] if i % 2 == 0 else x[-1 - i] for i in range(len(x))], y)
for n, a, b, m in ((8, 4, 4, 4), (8, 4, 4, 3), (30, 4, 4, 3), (60, 6, 10, 4), (30, 1, 1, 1)):
    print(f"fisher_{n}_{a}_{b}_{m},{stats.fisher_exact([[m, a - m], [b - m, n - a - b + m]], 'greater').pvalue:.15g}")
