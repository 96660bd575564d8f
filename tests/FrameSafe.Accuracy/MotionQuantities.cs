namespace FrameSafe.Accuracy;

/// <summary>Speeds, their composition, boosts and rotations.</summary>
internal static class MotionQuantities
{
    internal static Quantities LorentzFactor(ReferenceCase given)
    {
        Velocity<Yard> velocity = given.Has("beta") ? Velocity<Yard>.FromSpeedRatio(given.Number("beta"))
            : given.Has("celerity") ? Velocity<Yard>.FromCelerityRatio(given.Number("celerity"))
            : given.Has("rapidity") ? Velocity<Yard>.FromRapidity(given.Number("rapidity"))
            : Velocity<Yard>.FromLorentzFactorMinusOne(given.Number("gamma_minus_1"));
        return Speeds(velocity, signed: true);
    }

    internal static Quantities Collinear(ReferenceCase given)
    {
        bool isBeta = given.Has("beta1");
        Velocity<Yard> first = isBeta ? Velocity<Yard>.FromSpeedRatio(given.Number("beta1")) : Velocity<Yard>.FromCelerityRatio(given.Number("celerity1"));
        Velocity<Sled> second = isBeta ? Velocity<Sled>.FromSpeedRatio(given.Number("beta2")) : Velocity<Sled>.FromCelerityRatio(given.Number("celerity2"));
        return Speeds(Boost<Yard, Sled>.Into(first).Inverse.Map(second), signed: true);
    }

    internal static Quantities Composition(ReferenceCase given)
    {
        Velocity<Yard> composed = Boost<Yard, Sled>.Into(VelocityOf<Yard>(given, "v")).Inverse.Map(VelocityOf<Sled>(given, "u_prime"));
        return new Quantities()
            .Add("celerity", () => [composed.XCelerityRatio, composed.YCelerityRatio, composed.ZCelerityRatio])
            .Add("beta", () => [composed.XRatio, composed.YRatio, composed.ZRatio])
            .Add("u_m_per_s", () => [composed.XInMetresPerSecond, composed.YInMetresPerSecond, composed.ZInMetresPerSecond])
            .Add("gamma", () => composed.LorentzFactor)
            .Add("gamma_minus_1", () => composed.LorentzFactorMinusOne)
            .Add("speed_beta", () => composed.SpeedRatio)
            .Add("one_minus_speed_beta", () => composed.OneMinusSpeedRatio);
    }

    internal static Quantities BoostEvent(ReferenceCase given)
    {
        Boost<Yard, Sled> boost = Boost<Yard, Sled>.Into(VelocityOf<Yard>(given, "v"));
        SpacetimeEvent<Yard> @event = SpacetimeEvent<Yard>.FromSecondsAndMetres(given.Number("t"), given.Number("x"), given.Number("y"), given.Number("z"));
        SpacetimeEvent<Sled> carried = boost.Map(@event);
        SpacetimeInterval<Yard> interval = @event - default(SpacetimeEvent<Yard>);
        return new Quantities()
            .Add("gamma", () => boost.LorentzFactor.Value)
            .Add("t", () => carried.Time.InSeconds)
            .Add("r", () => [carried.Place.XInMetres, carried.Place.YInMetres, carried.Place.ZInMetres])
            .Add("interval_squared", () => interval.SquareInSquareMetres)
            .AddWord("kind_of_interval", () => interval.Class.ToString().ToLowerInvariant())
            .Add("invariant", () => Invariant(interval));
    }

    // Seconds or metres, as the file says.
    private static double Invariant(SpacetimeInterval<Yard> interval)
    {
        if (interval.Class == IntervalClass.Timelike)
            return Math.Abs(interval.ProperTimeInSeconds());
        return interval.ProperDistanceInMetres();
    }

    internal static Quantities Wigner(ReferenceCase given)
    {
        Velocity<Yard> v = VelocityOf<Yard>(given, "v");
        Velocity<Sled> u = VelocityOf<Sled>(given, "u_prime");
        // Into the sled's frame, then into the skate's: its inverse is L(v)L(u').
        LorentzTransform<Yard, Skate> into = Boost<Yard, Sled>.Into(v).Then(Boost<Sled, Skate>.Into(u));
        LorentzTransform<Skate, Yard> transform = into.Inverse;
        Velocity<Yard> resultant = into.Velocity;
        Velocity<Yard> reverse = Boost<Yard, Sled>.Into(VelocityOf<Yard>(given, "u_prime")).Inverse.Map(VelocityOf<Sled>(given, "v"));
        return new Quantities()
            .Add("angle", () => transform.RotationAngle)
            .Add("axis", () =>
            {
                (double x, double y, double z) = transform.RotationAxis;
                return [x, y, z];
            })
            .Add("resultant_celerity", () => [resultant.XCelerityRatio, resultant.YCelerityRatio, resultant.ZCelerityRatio])
            .Add("resultant_beta", () => [resultant.XRatio, resultant.YRatio, resultant.ZRatio])
            .Add("resultant_gamma", () => resultant.LorentzFactor)
            .Add("reverse_order_celerity", () => [reverse.XCelerityRatio, reverse.YCelerityRatio, reverse.ZCelerityRatio])
            .Add("rotation_matrix", () => transform.RotationMatrix());
    }

    internal static Velocity<TFrame> VelocityOf<TFrame>(ReferenceCase given, string name)
        where TFrame : struct, IFrame
    {
        if (given.Has(name + "_celerity"))
        {
            double[] w = given.Vector(name + "_celerity");
            return Velocity<TFrame>.FromCelerityRatio(w[0], w[1], w[2]);
        }

        if (given.Has(name + "_m_per_s"))
        {
            double[] m = given.Vector(name + "_m_per_s");
            return Velocity<TFrame>.FromMetresPerSecond(m[0], m[1], m[2]);
        }

        double[] beta = given.Vector(name);
        return Velocity<TFrame>.FromSpeedRatio(beta[0], beta[1], beta[2]);
    }

    private static Quantities Speeds(Velocity<Yard> velocity, bool signed) => new Quantities()
        .Add("gamma", () => velocity.LorentzFactor)
        .Add("gamma_minus_1", () => velocity.LorentzFactorMinusOne)
        .Add("beta", () => signed ? velocity.XRatio : velocity.SpeedRatio)
        .Add("one_minus_abs_beta", () => velocity.OneMinusSpeedRatio)
        .Add("celerity", () => velocity.XCelerityRatio)
        .Add("rapidity", () => Math.CopySign(velocity.Rapidity, velocity.XCelerityRatio));
}
