namespace WaterMix.SampleData;

/// <summary>What goes wrong at sea: lost values, doubtful and bad ones, bottles that leaked or closed at the wrong depth.</summary>
/// <param name="noise">The ocean's random numbers.</param>
internal sealed class Incidents(Noise noise)
{
    /// <summary>Nothing but oxygen and salinity was analysed here.</summary>
    public const int StationWithoutNutrients = 9;

    /// <summary>The CTD's oxygen sensor failed here.</summary>
    public const int StationWithoutCtdOxygen = 17;

    /// <summary>The CTD's conductivity cell was fouled here: its salinities are questionable and 0.02 too low.</summary>
    public const int StationWithFouledCell = 25;

    /// <summary>No bottle salinities were drawn here: the CTD's take their place.</summary>
    public const int StationWithoutBottleSalinity = 31;

    /// <summary>A deep bottle that closed at the surface; its values are flagged bad, the bottle itself is not flagged.</summary>
    public const int MistrippedStation = 21;

    /// <summary>A deep bottle flagged as having tripped wrongly; its values are not flagged.</summary>
    public const int FlaggedBottleStation = 14;

    /// <summary>A leaking bottle: air made its oxygen too high, questionable.</summary>
    public const int LeakingStation = 28;

    /// <summary>A bottle that did not close.</summary>
    public const int OpenBottleStation = 5;

    private static readonly Column[] _nutrients = [Column.Silcat, Column.Nitrat, Column.Phspht];

    private static readonly Column[] _waterSamples = [.. Enum.GetValues<Column>().Where(c => !Bottle.IsCtd(c))];

    /// <summary>Changes values and flags in place.</summary>
    /// <param name="bottles">All bottles of the cruise.</param>
    public void Apply(IReadOnlyList<Bottle> bottles)
    {
        foreach (Bottle bottle in bottles)
        {
            ApplyAtRandom(bottle);
            ApplyByStation(bottle);
        }

        Bottle wrong = At(bottles, MistrippedStation, 3);
        Bottle surface = bottles.First(b => b.Station == wrong.Station);
        Replace(wrong, surface, flag: 4);

        Bottle flagged = At(bottles, FlaggedBottleStation, 6);
        flagged.Flag = 4;
        Replace(flagged, bottles.Last(b => b.Station == flagged.Station && b.Pressure < 700), flag: 2);

        Bottle leaking = At(bottles, LeakingStation, 10);
        leaking.Flag = 3;
        leaking[Column.Oxygen] = new Measured(leaking.Parcel[Sources.Oxygen] + 14, 3);

        Bottle open = At(bottles, OpenBottleStation, 8);
        open.Flag = 9;
        Lose(open, _waterSamples);
    }

    private void ApplyAtRandom(Bottle bottle)
    {
        foreach (Column column in Enum.GetValues<Column>())
        {
            int tracer = Bottle.TracerOf(column);
            int key = (int)column + (10 * bottle.Cast);
            double u = noise.Uniform(Purpose.Flag, bottle.Station.Number, bottle.Sample, key);
            double off = Cruise.ErrorSd(tracer, bottle.Parcel[tracer]) * (u < 0.002 ? -1 : 1) * (6 + (4 * noise.Uniform(Purpose.Fault, bottle.Station.Number, bottle.Sample, key)));
            double value = bottle[column].Value;
            bool ctd = Bottle.IsCtd(column);
            bottle[column] = u switch
            {
                < 0.004 => new Measured(value + off, 3),
                >= 0.05 => bottle[column],
                _ when ctd => bottle[column],
                < 0.012 => new Measured(value + off, 3),
                < 0.016 => new Measured(value + (4 * off), 4),
                < 0.028 => Measured.Missing,
                _ => new Measured(value, 6),
            };
        }
    }

    private static void ApplyByStation(Bottle bottle)
    {
        switch (bottle.Station.Number)
        {
            case StationWithoutNutrients:
                Lose(bottle, _nutrients);
                break;
            case StationWithoutCtdOxygen:
                Lose(bottle, Column.Ctdoxy);
                break;
            case StationWithFouledCell:
                bottle[Column.Ctdsal] = new Measured(bottle[Column.Ctdsal].Value - 0.02, 3);
                break;
            case StationWithoutBottleSalinity:
                Lose(bottle, Column.Salnty);
                break;
        }
    }

    private static Bottle At(IReadOnlyList<Bottle> bottles, int station, int sample) =>
        bottles.Single(b => b.Station.Number == station && b.Cast == 1 && b.Sample == sample);

    private static void Lose(Bottle bottle, params ReadOnlySpan<Column> columns)
    {
        foreach (Column column in columns)
        {
            bottle[column] = Measured.Missing;
        }
    }

    /// <summary>The bottle holds the water of another place.</summary>
    private static void Replace(Bottle bottle, Bottle other, int flag)
    {
        foreach (Column column in _waterSamples)
        {
            bottle[column] = new Measured(other.Parcel[Bottle.TracerOf(column)], flag);
        }
    }
}
