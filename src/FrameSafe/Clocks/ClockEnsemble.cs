namespace FrameSafe;

/// <summary>Clocks of one field by name, any of them rated by any other.</summary>
/// <remarks>The rates compare as those of <see cref="FieldClock{TClock}"/> do: rate − 1 within 1 ulp of the clocks as they are given.</remarks>
public sealed class ClockEnsemble
{
    private readonly Dictionary<Type, FieldClock<FarClock>> _clocks = [];

    /// <summary>The clocks, in the order of their names.</summary>
    public IReadOnlyList<Type> Clocks => [.. _clocks.Keys.OrderBy(clock => clock.Name, StringComparer.Ordinal)];

    /// <summary>Takes a clock in; one of the same name takes the place of the former.</summary>
    public ClockEnsemble Add<TClock>(FieldClock<TClock> clock)
        where TClock : struct, IClock
    {
        _clocks[typeof(TClock)] = clock.Renamed<FarClock>();
        return this;
    }

    /// <summary>The rate of one clock by another.</summary>
    /// <exception cref="KeyNotFoundException">One of them is not in the ensemble.</exception>
    public ClockRate<TClock, TReference> Rate<TClock, TReference>()
        where TClock : struct, IClock
        where TReference : struct, IClock
        => Find(typeof(TClock)).Renamed<TClock>().Against(Find(typeof(TReference)).Renamed<TReference>());

    /// <summary>What each clock gains on each other one in a time of the other, as a table: gains[clock, reference].</summary>
    /// <param name="seconds">The time that the reference counts.</param>
    [return: Unit("s")]
    [return: Kind(QuantityKind.ClockOffset)]
    public double[,] GainsInSeconds([Unit("s")] double seconds)
    {
        IReadOnlyList<Type> clocks = Clocks;
        var gains = new double[clocks.Count, clocks.Count];
        for (int i = 0; i < clocks.Count; i++)
        {
            for (int j = 0; j < clocks.Count; j++)
                gains[i, j] = i == j ? 0 : Find(clocks[i]).Against(Find(clocks[j])).MinusOne * seconds;
        }

        return gains;
    }

    private FieldClock<FarClock> Find(Type clock)
        => _clocks.TryGetValue(clock, out FieldClock<FarClock> found)
            ? found
            : throw new KeyNotFoundException($"The ensemble has no clock {clock.Name}; it has {string.Join(", ", Clocks.Select(known => known.Name))}.");
}
