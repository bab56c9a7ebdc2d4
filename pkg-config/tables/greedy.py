"""Chooses the terms of a series one by one: always the one that takes most off the remaining error.

The columns offered are grouped in blocks (a cosine and a sine, or one of them). The choice works on the Gram matrix of
all columns, so that its cost does not grow with the number of instants; after each choice the matrix is projected, which
keeps later gains honest for columns that are nearly alike. The final amplitudes come from a least-squares solution.
"""

import numpy as np

ROWS_AT_ONCE = 2000

# A column whose part outside the chosen ones has shrunk below this is as good as chosen already.
NEARLY_DEPENDENT = 1e-5


def gram(columns_at, truth: np.ndarray) -> tuple[np.ndarray, np.ndarray]:
    """Gram matrix of the columns and their products with the truth, each per instant."""
    total, products = None, None
    for first in range(0, len(truth), ROWS_AT_ONCE):
        rows = slice(first, min(first + ROWS_AT_ONCE, len(truth)))
        part = columns_at(rows)
        square, product = part.T @ part, part.T @ truth[rows]
        total = square if total is None else total + square
        products = product if products is None else products + product
    return total / len(truth), products / len(truth)


def choose(g, b, mean_square, always, blocks, favour, tolerance) -> list[int]:
    """Indices of the blocks to keep, in the order chosen.

    `always` are columns that belong to the series in any case; `favour(i)` says how many times as welcome the gain of a
    block is as that of one that costs most to store; the choice ends at the tolerance (root mean square).
    """
    g, b = g.copy(), b.copy()
    own = np.diag(g).copy()
    remaining = mean_square

    def project(columns: list[int]) -> float:
        nonlocal g, b
        side = g[:, columns]
        inner = np.linalg.inv(g[np.ix_(columns, columns)])
        gain = float(b[columns] @ inner @ b[columns])
        b = b - side @ (inner @ b[columns])
        g = g - side @ inner @ side.T
        return gain

    for column in always:
        remaining -= project([column])
    first = np.array([block[0] for block in blocks])
    last = np.array([block[-1] for block in blocks])
    chosen: list[int] = []
    weight = np.array([favour(i) for i in range(len(blocks))], dtype=float)
    while remaining > tolerance**2 and len(chosen) < len(blocks):
        a, c, d = g[first, first], g[first, last], g[last, last]
        single = first == last
        with np.errstate(divide="ignore", invalid="ignore"):
            pair = (b[first] ** 2 * d - 2 * b[first] * b[last] * c + b[last] ** 2 * a) / (a * d - c * c)
            gain = np.where(single, b[first] ** 2 / a, pair)
        sound = np.where(
            single,
            a > NEARLY_DEPENDENT * own[first],
            (a * d - c * c > NEARLY_DEPENDENT * own[first] * own[last]),
        )
        score = np.where(sound & np.isfinite(gain), gain * weight, -1.0)
        score[chosen] = -1.0
        best = int(np.argmax(score))
        if score[best] <= 0:
            break
        remaining -= project(sorted(set(blocks[best])))
        chosen.append(best)
    return chosen


def solve(columns: np.ndarray, truth: np.ndarray) -> np.ndarray:
    """Least-squares amplitudes, with the columns brought to one scale first."""
    scale = np.sqrt((columns**2).mean(axis=0))
    normal = (columns / scale).T @ (columns / scale)
    right = (columns / scale).T @ truth
    factor = np.linalg.cholesky(normal)
    return np.linalg.solve(factor.T, np.linalg.solve(factor, right)) / scale
