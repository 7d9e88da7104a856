"""Reference numbers of LogisticRegressionTest, by numpy and scipy alone.

Run in this folder: python3 logistic-reference.py ../../../../resources/open-data
Fits the whole training file; prints the minimized objective and the number of right test rows.
"""
import csv
import sys

import numpy as np
from scipy.optimize import minimize


def load(path):
    rows = list(csv.reader(open(path)))[1:]
    # The product keeps features as 32-bit floats.
    x = np.array([[float(v) for v in row[:-1]] for row in rows], np.float32).astype(float)
    return x, np.array([int(row[-1]) for row in rows])


def fit(x, y, strength):
    n, d = x.shape
    k = y.max() + 1
    target = np.eye(k)[y]

    def loss(p):
        w, b = p[: k * d].reshape(k, d), p[k * d:]
        s = x @ w.T + b
        top = s.max(1)
        e = np.exp(s - top[:, None])
        total = e.sum(1)
        g = e / total[:, None] - target
        value = (np.log(total) + top - s[np.arange(n), y]).sum() + (w ** 2).sum() / (2 * strength)
        return value, np.concatenate([(g.T @ x + w / strength).ravel(), g.sum(0)])

    r = minimize(loss, np.zeros(k * d + k), jac=True, method="L-BFGS-B",
                 options=dict(maxiter=100000, maxfun=100000, ftol=0, gtol=1e-9 * n, maxcor=50))
    return r.fun, r.x[: k * d].reshape(k, d), r.x[k * d:]


for name in ["iris", "wine", "wdbc", "digits8x8"]:
    x, y = load(f"{sys.argv[1]}/{name}_train.csv")
    xt, yt = load(f"{sys.argv[1]}/{name}_test.csv")
    mean, sd = x.mean(0), x.std(0)
    sd[sd == 0] = 1
    for strength in [0.01, 0.1, 1, 10]:
        value, w, b = fit((x - mean) / sd, y, strength)
        right = ((((xt - mean) / sd) @ w.T + b).argmax(1) == yt).sum()
        print(f'"{name}, {strength}, {value:.10g}, {right}, {len(yt)}",')
