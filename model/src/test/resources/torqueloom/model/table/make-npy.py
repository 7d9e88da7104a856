"""Writes the NPY files of this folder with NumPy 2.4.6; run it in this folder."""
import numpy as np

values = np.array([[1.5, -2, 0], [1e-300, 3e38, 7]])
np.save("float64.npy", values)
np.save("float32.npy", np.array([1.5, -0.1, 3], dtype="<f4"))
np.save("int32.npy", np.array([[1, -2], [3, 2147483647]], dtype="<i4"))
np.save("int64.npy", np.array([-5, 2**40]))
np.save("uint8.npy", np.array([0, 128, 255], dtype="u1"))
np.save("scalar.npy", np.float64(2.5))
np.save("fortran.npy", np.asfortranarray(values))
np.save("big-endian.npy", values.astype(">f8"))
np.save("object.npy", np.array([{"a": 1}], dtype=object), allow_pickle=True)
np.save("text.npy", np.array(["a", "bc"]))
np.save("structured.npy", np.zeros(2, dtype=[("a", "<f4"), ("b", "<i4")]))
