using System.Numerics;

namespace WaterMix.Core.Tests.Mixing.Exact;

/// <summary>An exact fraction of integers. Every finite double is one.</summary>
internal readonly struct Rational : IComparable<Rational>
{
    private readonly BigInteger _denominatorLessOne;

    private Rational(BigInteger numerator, BigInteger denominator)
    {
        BigInteger common = BigInteger.GreatestCommonDivisor(numerator, denominator);
        if (denominator.Sign < 0)
        {
            common = -common;
        }

        Numerator = numerator / common;
        _denominatorLessOne = (denominator / common) - 1;
    }

    public static Rational Zero => default;

    public static Rational One => new(BigInteger.One, BigInteger.One);

    public BigInteger Numerator { get; }

    public BigInteger Denominator => _denominatorLessOne + 1;

    public int Sign => Numerator.Sign;

    public static Rational From(double value)
    {
        long bits = BitConverter.DoubleToInt64Bits(value);
        int exponent = (int)((bits >> 52) & 0x7FF);
        long mantissa = bits & 0xFFFFFFFFFFFFF;
        mantissa = exponent == 0 ? mantissa << 1 : mantissa | (1L << 52);
        BigInteger signed = bits < 0 ? -mantissa : mantissa;
        int power = exponent - 1075;
        return power >= 0
            ? new Rational(signed << power, BigInteger.One)
            : new Rational(signed, BigInteger.One << -power);
    }

    public static Rational operator +(Rational a, Rational b) =>
        new((a.Numerator * b.Denominator) + (b.Numerator * a.Denominator), a.Denominator * b.Denominator);

    public static Rational operator -(Rational a, Rational b) =>
        new((a.Numerator * b.Denominator) - (b.Numerator * a.Denominator), a.Denominator * b.Denominator);

    public static Rational operator -(Rational a) => new(-a.Numerator, a.Denominator);

    public static Rational operator *(Rational a, Rational b) => new(a.Numerator * b.Numerator, a.Denominator * b.Denominator);

    public static Rational operator /(Rational a, Rational b) => new(a.Numerator * b.Denominator, a.Denominator * b.Numerator);

    public int CompareTo(Rational other) => (this - other).Sign;

    public double ToDouble()
    {
        // Scales to about 80 significant bits before dividing, so that neither part overflows a double.
        long shift = (long)Numerator.GetBitLength() - (long)Denominator.GetBitLength() - 80;
        BigInteger quotient = shift >= 0
            ? Numerator / (Denominator << (int)shift)
            : (Numerator << (int)-shift) / Denominator;
        return Math.ScaleB((double)quotient, (int)shift);
    }
}
