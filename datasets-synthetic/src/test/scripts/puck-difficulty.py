"""How hard the demo's task is, by numpy and scipy alone.

Run: python3 puck-difficulty.py ../../../demo/puck.csv [seed]
Prints test accuracies (random 60/20/20 split) of a multinomial logistic regression (L2, C = 1), of a
network of 48 rectified linear units (Adam, 60 epochs, best epoch by validation), and of 48 counting
units that stand for the device: counts of 0, 1 or 2 a slot, drawn from two logistic steps at drives
6.7 and 13.5 of width 0.4 (in units of a full-scale weight), 8 slots, weights within +-1, 32 input
levels. Seen with seed 1 (numpy 2.4.6, scipy 1.17.1): 0.888, 0.969, 0.959.
"""
import csv
import sys

import numpy as np
from scipy.optimize import minimize

rows = list(csv.reader(open(sys.argv[1])))[1:]
x = np.array([[float(v) for v in row[:-1]] for row in rows])
names = sorted({row[-1] for row in rows})
y = np.array([names.index(row[-1]) for row in rows])
rng = np.random.default_rng(int(sys.argv[2]) if len(sys.argv) > 2 else 1)
order = rng.permutation(len(y))
train, validation, test = np.split(order, [int(0.6 * len(y)), int(0.8 * len(y))])
z = (x - x[train].mean(0)) / x[train].std(0)
low, high = np.percentile(x[train], [1, 99], axis=0)
levels = np.round(np.clip((x - low) / (high - low), 0, 1) * 31) / 31
classes, features, hidden, epochs, slots = len(names), x.shape[1], 48, 60, 8


def softmax(scores):
    e = np.exp(scores - scores.max(1, keepdims=True))
    return e / e.sum(1, keepdims=True)


def logistic(strength):
    target, a = np.eye(classes)[y[train]], z[train]
    cut = classes * features

    def loss(p):
        w, b = p[:cut].reshape(classes, features), p[cut:]
        q = softmax(a @ w.T + b)
        g = q - target
        value = -np.log(q[target > 0]).sum() + (w ** 2).sum() / (2 * strength)
        return value, np.concatenate([(g.T @ a + w / strength).ravel(), g.sum(0)])

    p = minimize(loss, np.zeros(cut + classes), jac=True, method="L-BFGS-B",
                 options=dict(maxiter=2000)).x
    return (z[test] @ p[:cut].reshape(classes, features).T + p[cut:]).argmax(1)


class Adam:
    def __init__(self, *parameters):
        self.parameters = parameters
        self.m = [np.zeros_like(p) for p in parameters]
        self.v = [np.zeros_like(p) for p in parameters]
        self.t = 0

    def step(self, rate, *gradients):
        self.t += 1
        for p, m, v, g in zip(self.parameters, self.m, self.v, gradients):
            m += 0.1 * (g - m)
            v += 0.001 * (g * g - v)
            p -= rate * (m / (1 - 0.9 ** self.t)) / (np.sqrt(v / (1 - 0.999 ** self.t)) + 1e-8)


def train_network(inputs, first, offset, activation, slope, bound, rate):
    second = rng.normal(0, 0.2, (hidden, classes))
    bias = np.zeros(classes)
    adam = Adam(first, offset, second, bias)
    best, answer = -1.0, None

    def predict(part):
        return (activation(inputs[part] @ first + offset) @ second + bias).argmax(1)

    for epoch in range(epochs):
        shuffled = rng.permutation(train)
        for i in range(0, len(shuffled), 64):
            part = shuffled[i:i + 64]
            drive = inputs[part] @ first + offset
            h = activation(drive)
            g = softmax(h @ second + bias)
            g[np.arange(len(part)), y[part]] -= 1
            g /= len(part)
            back = (g @ second.T) * slope(drive)
            adam.step(rate * (1 - epoch / epochs) + 1e-5,
                      inputs[part].T @ back, back.sum(0), h.T @ g, g.sum(0))
            np.clip(first, -bound, bound, out=first)
        accuracy = (predict(validation) == y[validation]).mean()
        if accuracy > best:
            best, answer = accuracy, predict(test)
    return answer


def step(drive, threshold, width):
    return 1 / (1 + np.exp(-(drive - threshold) / width))


def counts(drive):
    drive = np.clip(drive, 0, 20)
    return (rng.binomial(slots, step(drive, 6.7, 0.4))
            + rng.binomial(slots, step(drive, 13.5, 0.4))) / slots


def widened_slope(drive):
    a, b = step(drive, 6.7, 1.0), step(drive, 13.5, 1.0)
    return a * (1 - a) + b * (1 - b)


def report(name, answer):
    print(f"{name}: {(answer == y[test]).mean():.4f}")
    confusion = np.zeros((classes, classes), int)
    np.add.at(confusion, (y[test], answer), 1)
    print(confusion)


print(names)
report("logistic regression", logistic(1.0))
report("rectified linear", train_network(
    z, rng.normal(0, np.sqrt(2 / features), (features, hidden)), np.zeros(hidden),
    lambda d: np.maximum(d, 0), lambda d: (d > 0) * 1.0, np.inf, 2e-3))
weights = 0.6 * rng.uniform(-1, 1, (features, hidden))
report("counting", train_network(
    levels, weights, 8 - 0.5 * weights.sum(0) + rng.normal(0, 1, hidden),
    counts, widened_slope, 1.0, 6e-3))
