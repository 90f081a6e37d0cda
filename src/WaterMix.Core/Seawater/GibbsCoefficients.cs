namespace WaterMix.Core.Seawater;

/// <summary>
/// The coefficients of the TEOS-10 Gibbs function, J/kg, <c>IOC2010</c>, appendices G (pure water) and H (saline part):
/// g = sum W_jk y^j z^k + sum (S_1jk x^2 ln x + sum over i > 1 of S_ijk x^i) y^j z^k,
/// with x = sqrt(S_A / 40.188617), y = t / 40 degC and z = p / 10,000 dbar.
/// </summary>
internal static class GibbsCoefficients
{
    // Pure water: W, then the power of temperature and the power of pressure.
    public const double W00 = 101.342743139674;
    public const double W01 = 100015.695367145;
    public const double W02 = -2544.5765420363;
    public const double W03 = 284.517778446287;
    public const double W04 = -33.3146754253611;
    public const double W05 = 4.20263108803084;
    public const double W06 = -0.546428511471039;
    public const double W10 = 5.90578347909402;
    public const double W11 = -270.983805184062;
    public const double W12 = 776.153611613101;
    public const double W13 = -196.51255088122;
    public const double W14 = 28.9796526294175;
    public const double W15 = -2.13290083518327;
    public const double W20 = -12357.785933039;
    public const double W21 = 1455.0364540468;
    public const double W22 = -756.558385769359;
    public const double W23 = 273.479662323528;
    public const double W24 = -55.5604063817218;
    public const double W25 = 4.34420671917197;
    public const double W30 = 736.741204151612;
    public const double W31 = -672.50778314507;
    public const double W32 = 499.360390819152;
    public const double W33 = -239.545330654412;
    public const double W34 = 48.8012518593872;
    public const double W35 = -1.66307106208905;
    public const double W40 = -148.185936433658;
    public const double W41 = 397.968445406972;
    public const double W42 = -301.815380621876;
    public const double W43 = 152.196371733841;
    public const double W44 = -26.3748377232802;
    public const double W50 = 58.0259125842571;
    public const double W51 = -194.618310617595;
    public const double W52 = 120.520654902025;
    public const double W53 = -55.2723052340152;
    public const double W54 = 6.48190668077221;
    public const double W60 = -18.9843846514172;
    public const double W61 = 63.5113936641785;
    public const double W62 = -22.2897317140459;
    public const double W63 = 8.17060541818112;
    public const double W70 = 3.05081646487967;
    public const double W71 = -9.63108119393062;

    // Saline part: S, then the powers of root salinity, temperature and pressure. S100 and S110 stand before x^2 ln x.
    public const double S100 = 5812.81456626732;
    public const double S110 = 851.226734946706;
    public const double S200 = 1416.27648484197;
    public const double S201 = -3310.49154044839;
    public const double S202 = 384.794152978599;
    public const double S203 = -96.5324320107458;
    public const double S204 = 15.8408172766824;
    public const double S205 = -2.62480156590992;
    public const double S210 = 168.072408311545;
    public const double S211 = 729.116529735046;
    public const double S212 = -343.956902961561;
    public const double S213 = 124.687671116248;
    public const double S214 = -31.656964386073;
    public const double S215 = 7.04658803315449;
    public const double S220 = 880.031352997204;
    public const double S221 = -860.764303783977;
    public const double S222 = 337.409530269367;
    public const double S223 = -178.314556207638;
    public const double S224 = 44.2040358308;
    public const double S225 = -7.92001547211682;
    public const double S230 = -225.267649263401;
    public const double S231 = 694.244814133268;
    public const double S232 = -204.889641964903;
    public const double S233 = 113.561697840594;
    public const double S234 = -11.1282734326413;
    public const double S240 = 91.4260447751259;
    public const double S241 = -297.728741987187;
    public const double S242 = 74.726141138756;
    public const double S243 = -36.4872919001588;
    public const double S250 = -21.6603240875311;
    public const double S260 = 2.13016970847183;
    public const double S300 = -2432.14662381794;
    public const double S301 = 199.459603073901;
    public const double S302 = -52.2940909281335;
    public const double S303 = 68.0444942726459;
    public const double S304 = -3.41251932441282;
    public const double S310 = -493.407510141682;
    public const double S311 = -175.292041186547;
    public const double S312 = 83.1923927801819;
    public const double S313 = -29.483064349429;
    public const double S320 = -43.0664675978042;
    public const double S321 = 383.058066002476;
    public const double S322 = -54.1917262517112;
    public const double S323 = 25.6398487389914;
    public const double S330 = -10.0227370861875;
    public const double S331 = -460.319931801257;
    public const double S340 = 0.875600661808945;
    public const double S341 = 234.565187611355;
    public const double S400 = 2025.80115603697;
    public const double S401 = -54.7919133532887;
    public const double S402 = -4.08193978912261;
    public const double S403 = -30.1755111971161;
    public const double S410 = 543.835333000098;
    public const double S411 = -22.6683558512829;
    public const double S420 = -68.5572509204491;
    public const double S430 = 49.3667694856254;
    public const double S440 = -17.1397577419788;
    public const double S450 = 2.49697009569508;
    public const double S500 = -1091.66841042967;
    public const double S501 = 36.0284195611086;
    public const double S510 = -196.028306689776;
    public const double S600 = 374.60123787784;
    public const double S610 = 36.7571622995805;
    public const double S700 = -48.5891069025409;
}
