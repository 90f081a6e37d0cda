using WaterMix.Core.Mixing.Kernels;

namespace WaterMix.Core.Mixing;

/// <summary>A small covariance matrix and its Cholesky factor C, S = C C'; whitening is C^-1. Owns its arrays; not thread-safe.</summary>
internal sealed class Covariance
{
    private double[] _values = [];
    private int _size;

    /// <summary>Starts a matrix of zeros.</summary>
    public void Reshape(int size)
    {
        _size = size;
        if (_values.Length < size * size)
        {
            _values = new double[size * size];
        }

        _values.AsSpan(0, size * size).Clear();
    }

    /// <summary>One entry; only those with column &lt;= row are read.</summary>
    public ref double this[int row, int column] => ref _values[(row * _size) + column];

    /// <summary>Replaces the matrix by its Cholesky factor; false where it is not positive definite.</summary>
    public bool Factor()
    {
        for (int i = 0; i < _size; i++)
        {
            for (int j = 0; j <= i; j++)
            {
                double value = this[i, j] - Vectors.Dot(_values.AsSpan(i * _size, j), _values.AsSpan(j * _size, j));
                if (i != j)
                {
                    this[i, j] = value / this[j, j];
                }
                else if (value > 0 && double.IsFinite(value))
                {
                    this[i, i] = Math.Sqrt(value);
                }
                else
                {
                    return false;
                }
            }
        }

        return true;
    }

    /// <summary>C^-1 v in place.</summary>
    public void Whiten(Span<double> v)
    {
        for (int i = 0; i < _size; i++)
        {
            v[i] = (v[i] - Vectors.Dot(_values.AsSpan(i * _size, i), v[..i])) / this[i, i];
        }
    }
}
