namespace WaterMix.Core.Seawater;

/// <summary>
/// The 75 coefficients of specific volume, m3/kg, <c>Roquet2015</c>: v = sum V_ijk s^i y^j z^k, with
/// s = sqrt((S_A + 24) / 40.188617), y = CT / 40 degC and z = p / 10,000 dbar. V, then the powers of salinity, temperature, pressure.
/// </summary>
internal static class SpecificVolumeCoefficients
{
    public const double V000 = 1.0769995862e-3;
    public const double V100 = -3.1038981976e-4;
    public const double V200 = 6.6928067038e-4;
    public const double V300 = -8.5047933937e-4;
    public const double V400 = 5.8086069943e-4;
    public const double V500 = -2.1092370507e-4;
    public const double V600 = 3.1932457305e-5;
    public const double V010 = -1.5649734675e-5;
    public const double V110 = 3.5009599764e-5;
    public const double V210 = -4.3592678561e-5;
    public const double V310 = 3.4532461828e-5;
    public const double V410 = -1.1959409788e-5;
    public const double V510 = 1.3864594581e-6;
    public const double V020 = 2.7762106484e-5;
    public const double V120 = -3.7435842344e-5;
    public const double V220 = 3.5907822760e-5;
    public const double V320 = -1.8698584187e-5;
    public const double V420 = 3.8595339244e-6;
    public const double V030 = -1.6521159259e-5;
    public const double V130 = 2.4141479483e-5;
    public const double V230 = -1.4353633048e-5;
    public const double V330 = 2.2863324556e-6;
    public const double V040 = 6.9111322702e-6;
    public const double V140 = -8.7595873154e-6;
    public const double V240 = 4.3703680598e-6;
    public const double V050 = -8.0539615540e-7;
    public const double V150 = -3.3052758900e-7;
    public const double V060 = 2.0543094268e-7;
    public const double V001 = -6.0799143809e-5;
    public const double V101 = 2.4262468747e-5;
    public const double V201 = -3.4792460974e-5;
    public const double V301 = 3.7470777305e-5;
    public const double V401 = -1.7322218612e-5;
    public const double V501 = 3.0927427253e-6;
    public const double V011 = 1.8505765429e-5;
    public const double V111 = -9.5677088156e-6;
    public const double V211 = 1.1100834765e-5;
    public const double V311 = -9.8447117844e-6;
    public const double V411 = 2.5909225260e-6;
    public const double V021 = -1.1716606853e-5;
    public const double V121 = -2.3678308361e-7;
    public const double V221 = 2.9283346295e-6;
    public const double V321 = -4.8826139200e-7;
    public const double V031 = 7.9279656173e-6;
    public const double V131 = -3.4558773655e-6;
    public const double V231 = 3.1655306078e-7;
    public const double V041 = -3.4102187482e-6;
    public const double V141 = 1.2956717783e-6;
    public const double V051 = 5.0736766814e-7;
    public const double V002 = 9.9856169219e-6;
    public const double V102 = -5.8484432984e-7;
    public const double V202 = -4.8122251597e-6;
    public const double V302 = 4.9263106998e-6;
    public const double V402 = -1.7811974727e-6;
    public const double V012 = -1.1736386731e-6;
    public const double V112 = -5.5699154557e-6;
    public const double V212 = 5.4620748834e-6;
    public const double V312 = -1.3544185627e-6;
    public const double V022 = 2.1305028740e-6;
    public const double V122 = 3.9137387080e-7;
    public const double V222 = -6.5731104067e-7;
    public const double V032 = -4.6132540037e-7;
    public const double V132 = 7.7618888092e-9;
    public const double V042 = -6.3352916514e-8;
    public const double V003 = -1.1309361437e-6;
    public const double V103 = 3.6310188515e-7;
    public const double V203 = 1.6746303780e-8;
    public const double V013 = -3.6527006553e-7;
    public const double V113 = -2.7295696237e-7;
    public const double V023 = 2.8695905159e-7;
    public const double V004 = 1.0531153080e-7;
    public const double V104 = -1.1147125423e-7;
    public const double V014 = 3.1454099902e-7;
    public const double V005 = -1.2647261286e-8;
    public const double V006 = 1.9613503930e-9;
}
