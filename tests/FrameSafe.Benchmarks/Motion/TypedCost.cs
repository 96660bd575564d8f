using BenchmarkDotNet.Attributes;

namespace FrameSafe.Benchmarks.Motion;

/// <summary>
/// The typed boost and Lorentz factor beside the same arithmetic on plain doubles: what the frame in the type costs, which should
/// be nothing, in time and in allocation.
/// </summary>
[MemoryDiagnoser]
public class TypedCost
{
    private const int Count = 4096;
    private const double C = 299_792_458;
    private readonly SpacetimeEvent<Yard>[] _typed = new SpacetimeEvent<Yard>[Count];
    private readonly double[] _plain = new double[4 * Count];
    private readonly Velocity<Yard>[] _velocities = new Velocity<Yard>[Count];
    private readonly double[] _celerities = new double[3 * Count];
    private Boost<Yard, Sled> _boost;

    private readonly struct Yard : IInertialFrame;

    private readonly struct Sled : IInertialFrame;

    [GlobalSetup]
    public void Fill()
    {
        var random = new Random(1);
        _boost = Boost<Yard, Sled>.Into(Velocity<Yard>.FromCelerityRatio(0.3, -0.4, 0.5));
        for (int i = 0; i < Count; i++)
        {
            for (int j = 0; j < 4; j++)
                _plain[(4 * i) + j] = random.NextDouble();
            _typed[i] = SpacetimeEvent<Yard>.FromSecondsAndMetres(_plain[4 * i], _plain[(4 * i) + 1], _plain[(4 * i) + 2], _plain[(4 * i) + 3]);
            for (int j = 0; j < 3; j++)
                _celerities[(3 * i) + j] = random.NextDouble();
            _velocities[i] = Velocity<Yard>.FromCelerityRatio(_celerities[3 * i], _celerities[(3 * i) + 1], _celerities[(3 * i) + 2]);
        }
    }

    [Benchmark(Baseline = true)]
    public double PlainBoost()
    {
        double sum = 0;
        for (int i = 0; i < Count; i++)
        {
            double x = 0.3, y = -0.4, z = 0.5;
            double norm = Norm(x, y, z);
            double lorentz = norm < 1e8 ? Math.Sqrt(Math.FusedMultiplyAdd(norm, norm, 1)) : norm;
            double light = C * _plain[4 * i];
            double along = Math.FusedMultiplyAdd(x, _plain[(4 * i) + 1], Math.FusedMultiplyAdd(y, _plain[(4 * i) + 2], z * _plain[(4 * i) + 3]));
            double factor = (along / (1 + lorentz)) - light;
            sum += (Math.FusedMultiplyAdd(lorentz, light, -along) / C) + Math.FusedMultiplyAdd(x, factor, _plain[(4 * i) + 1])
                + Math.FusedMultiplyAdd(y, factor, _plain[(4 * i) + 2]) + Math.FusedMultiplyAdd(z, factor, _plain[(4 * i) + 3]);
        }

        return sum;
    }

    [Benchmark]
    public double TypedBoost()
    {
        double seconds = 0;
        double metres = 0;
        foreach (SpacetimeEvent<Yard> @event in _typed)
        {
            SpacetimeEvent<Sled> carried = _boost.Map(@event);
            seconds += carried.Time.InSeconds;
            metres += carried.Place.XInMetres + carried.Place.YInMetres + carried.Place.ZInMetres;
        }

        return seconds * metres;
    }

    [Benchmark]
    public double PlainLorentzFactor()
    {
        double sum = 0;
        for (int i = 0; i < Count; i++)
        {
            double norm = Norm(_celerities[3 * i], _celerities[(3 * i) + 1], _celerities[(3 * i) + 2]);
            sum += norm < 1e8 ? Math.Sqrt(Math.FusedMultiplyAdd(norm, norm, 1)) : norm;
        }

        return sum;
    }

    [Benchmark]
    public double TypedLorentzFactor()
    {
        double sum = 0;
        foreach (Velocity<Yard> velocity in _velocities)
            sum += velocity.LorentzFactor;
        return sum;
    }

    private static double Norm(double x, double y, double z)
    {
        double largest = Math.Max(Math.Abs(x), Math.Max(Math.Abs(y), Math.Abs(z)));
        return largest is > 1e-140 and < 1e140
            ? Math.Sqrt(Math.FusedMultiplyAdd(x, x, Math.FusedMultiplyAdd(y, y, z * z)))
            : largest;
    }
}
