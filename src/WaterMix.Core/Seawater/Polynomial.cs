using System.Runtime.CompilerServices;

namespace WaterMix.Core.Seawater;

/// <summary>a0 + a1 x + a2 x^2 + ..., from the highest power down (Horner): each call is one row of a printed table of coefficients.</summary>
internal static class Polynomial
{
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static double Of(double x, double a0, double a1) => a0 + (x * a1);

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static double Of(double x, double a0, double a1, double a2) => a0 + (x * Of(x, a1, a2));

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static double Of(double x, double a0, double a1, double a2, double a3) => a0 + (x * Of(x, a1, a2, a3));

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static double Of(double x, double a0, double a1, double a2, double a3, double a4) =>
        a0 + (x * Of(x, a1, a2, a3, a4));

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static double Of(double x, double a0, double a1, double a2, double a3, double a4, double a5) =>
        a0 + (x * Of(x, a1, a2, a3, a4, a5));

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static double Of(double x, double a0, double a1, double a2, double a3, double a4, double a5, double a6) =>
        a0 + (x * Of(x, a1, a2, a3, a4, a5, a6));

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static double Of(double x, double a0, double a1, double a2, double a3, double a4, double a5, double a6, double a7) =>
        a0 + (x * Of(x, a1, a2, a3, a4, a5, a6, a7));
}
