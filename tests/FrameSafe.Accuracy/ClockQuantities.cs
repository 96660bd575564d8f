namespace FrameSafe.Accuracy;

/// <summary>Clocks in gravity.</summary>
internal static class ClockQuantities
{
    internal static Quantities Gravity(ReferenceCase given)
    {
        switch (given.Kind)
        {
            case "static":
            {
                SchwarzschildField field = SchwarzschildField.FromGravitationalParameter(given.Number("GM"));
                ClockRate<Sled, FarClock> rate = field.StaticClock<Sled>(given.Number("r")).Rate;
                return Rates(rate).Add("compactness", () => field.Compactness(given.Number("r"))).Add("redshift_to_infinity", () => rate.Redshift);
            }

            case "static_pair":
            {
                SchwarzschildField field = SchwarzschildField.FromGravitationalParameter(given.Number("GM"));
                ClockRate<Sled, Yard> pair = field.StaticClock<Sled>(given.Number("r"), given.Number("h")).Against(field.StaticClock<Yard>(given.Number("r")));
                return new Quantities()
                    .Add("ratio", () => pair.Rate)
                    .Add("ratio_minus_1", () => pair.MinusOne)
                    .Add("newtonian_dPhi_over_c2", () => field.NewtonianShift(given.Number("r"), given.Number("h")));
            }

            case "orbit":
            {
                SchwarzschildField field = SchwarzschildField.FromGravitationalParameter(given.Number("GM"));
                double r = given.Number("r");
                return Rates(field.OrbitingClock<Sled>(r).Rate)
                    .Add("coordinate_period", () => field.OrbitalPeriod(r))
                    .Add("coordinate_speed", () => field.OrbitalSpeed(r))
                    .Add("local_speed_beta", () => field.LocalOrbitalSpeedRatio(r));
            }

            case "orbit_vs_static":
            {
                SchwarzschildField field = SchwarzschildField.FromGravitationalParameter(given.Number("GM"));
                return Pair(field.OrbitingClock<Sled>(given.Number("r_orbit")).Against(field.StaticClock<Yard>(given.Number("r_static"))));
            }

            case "orbit_vs_rotating":
            {
                SchwarzschildField field = SchwarzschildField.FromGravitationalParameter(given.Number("GM"));
                return Pair(field.OrbitingClock<Sled>(given.Number("r_orbit")).Against(field.MovingClock<Yard>(given.Number("r_ground"), given.Number("v_ground"))));
            }

            case "horizon":
            {
                ClockRate<Sled, FarClock> rate = SchwarzschildField.FromHorizonRadius(given.Number("r_s")).StaticClockAboveHorizon<Sled>(given.Number("delta")).Rate;
                return Rates(rate).Add("redshift_to_infinity", () => rate.Redshift);
            }

            case "weak_moving":
                return new Quantities()
                    .Add("rate_minus_1_sqrt_form", () => WeakField.Clock<Sled>(given.Number("phi"), given.Number("v")).Rate.MinusOne)
                    .Add("rate_minus_1_first_order", () => WeakField.FirstOrderRateMinusOne(given.Number("phi"), given.Number("v")));
            case "uniform":
                return new Quantities()
                    .Add("gh_over_c2", () => WeakField.UniformFieldRateMinusOne(given.Number("g"), given.Number("h")))
                    .Add("upper_over_lower_minus_1", () => WeakField.UniformFieldRateMinusOne(given.Number("g"), given.Number("h")));
            case "potential_pair":
                return new Quantities().Add(
                    "exact_ratio_minus_1",
                    () => WeakField.Clock<Sled>(given.Number("phi2")).Against(WeakField.Clock<Yard>(given.Number("phi1"))).MinusOne);
            default:
                return new Quantities();
        }
    }

    internal static Quantities Acceleration(ReferenceCase given)
    {
        double a = given.Number("a");
        if (given.Kind == "trip_flip")
        {
            Trip<Yard, Sled> flip = Trip<Yard, Sled>.Flip(a, given.Number("distance"));
            return new Quantities()
                .Add("ship_time", () => flip.ShipTime.InSeconds)
                .Add("home_time", () => flip.HomeTime.InSeconds)
                .Add("home_minus_ship", () => flip.HomeAheadInSeconds)
                .Add("peak_gamma", () => flip.Peak.Velocity.LorentzFactor)
                .Add("peak_gamma_minus_1", () => flip.Peak.LorentzFactorMinusOne)
                .Add("peak_beta", () => flip.Peak.Velocity.SpeedRatio)
                .Add("one_minus_peak_beta", () => flip.Peak.Velocity.OneMinusSpeedRatio)
                .Add("peak_celerity", () => flip.Peak.Velocity.CelerityRatio)
                .Add("peak_rapidity", () => flip.Peak.Rapidity);
        }

        if (given.Kind == "trip_coast")
        {
            Trip<Yard, Sled> coast = Trip<Yard, Sled>.Coast(a, given.Number("distance"), given.Number("cruise_celerity"));
            return new Quantities()
                .Add("ship_time", () => coast.ShipTime.InSeconds)
                .Add("home_time", () => coast.HomeTime.InSeconds)
                .Add("home_minus_ship", () => coast.HomeAheadInSeconds)
                .Add("accel_distance", () => coast.Peak.Distance.XInMetres)
                .Add("coast_distance", () => coast.CoastDistanceInMetres)
                .Add("coast_home_time", () => coast.CoastHomeTime.InSeconds)
                .Add("coast_ship_time", () => coast.CoastShipTime.InSeconds)
                .Add("cruise_beta", () => coast.Peak.Velocity.SpeedRatio)
                .Add("cruise_gamma", () => coast.Peak.Velocity.LorentzFactor);
        }

        AcceleratedMotion<Yard, Sled> motion = given.Kind switch
        {
            "tau" => AcceleratedMotion<Yard, Sled>.AfterProperTime(a, ProperTime<Sled>.FromSeconds(given.Number("tau"))),
            "t" => AcceleratedMotion<Yard, Sled>.AfterTime(a, CoordinateTime<Yard>.FromSeconds(given.Number("t"))),
            "x" => AcceleratedMotion<Yard, Sled>.AtDistance(a, given.Number("x")),
            "beta" => AcceleratedMotion<Yard, Sled>.AtSpeedRatio(a, given.Number("beta")),
            "celerity" => AcceleratedMotion<Yard, Sled>.AtCelerityRatio(a, given.Number("celerity")),
            _ => AcceleratedMotion<Yard, Sled>.AtLorentzFactorMinusOne(a, given.Number("gamma_minus_1")),
        };
        return new Quantities()
            .Add("tau", () => motion.ProperTime.InSeconds)
            .Add("t", () => motion.Time.InSeconds)
            .Add("x", () => motion.Distance.XInMetres)
            .Add("beta", () => motion.Velocity.SpeedRatio)
            .Add("one_minus_beta", () => motion.Velocity.OneMinusSpeedRatio)
            .Add("gamma", () => motion.Velocity.LorentzFactor)
            .Add("gamma_minus_1", () => motion.LorentzFactorMinusOne)
            .Add("celerity", () => motion.Velocity.CelerityRatio)
            .Add("rapidity", () => motion.Rapidity)
            .Add("t_minus_tau", () => motion.TimeMinusProperTimeInSeconds)
            .Add("x_newton_excess", () => motion.DistanceBeyondNewtonianInMetres);
    }

    internal static Quantities Path(ReferenceCase given)
    {
        if (given.Kind == "circular")
        {
            CircularMotion<Yard, Sled> circle = CircularMotion<Yard, Sled>.Of(given.Number("radius"), given.Number("omega"));
            CoordinateTime<Yard> time = CoordinateTime<Yard>.FromSeconds(given.Number("t"));
            return new Quantities()
                .Add("speed_m_per_s", () => circle.SpeedInMetresPerSecond)
                .Add("beta", () => circle.SpeedRatio)
                .Add("gamma", () => circle.LorentzFactor)
                .Add("gamma_minus_1", () => circle.LorentzFactorMinusOne)
                .Add("rate_minus_1", () => circle.RateMinusOne)
                .Add("proper_acceleration", () => circle.ProperAccelerationInMetresPerSquareSecond)
                .Add("tau", () => circle.ProperTimeOf(time).InSeconds)
                .Add("t_minus_tau", () => circle.BehindInSeconds(time));
        }

        Worldline<Yard, Sled> line = default;
        if (given.Kind == "waypoints")
        {
            SpacetimeEvent<Yard>[] events =
                [.. given.Vectors("events").Select(e => SpacetimeEvent<Yard>.FromSecondsAndMetres(e[0], e[1], e[2], e[3]))];
            for (int i = 1; i < events.Length; i++)
                line = line.Then(events[i] - events[i - 1]);
        }
        else
        {
            CoordinateTime<Yard>[] times = [.. given.Vector("dt").Select(CoordinateTime<Yard>.FromSeconds)];
            Velocity<Yard>[] velocities = given.Kind switch
            {
                "legs" => [.. given.Vector("v_m_per_s").Select(v => Velocity<Yard>.FromMetresPerSecond(v))],
                "legs_beta" => [.. given.Vector("beta").Select(b => Velocity<Yard>.FromSpeedRatio(b))],
                _ => [.. given.Vectors("beta").Select(b => Velocity<Yard>.FromSpeedRatio(b[0], b[1], b[2]))],
            };
            foreach ((CoordinateTime<Yard> time, Velocity<Yard> velocity) in times.Zip(velocities))
                line = line.Then(time, velocity);
        }

        bool isVector = given.Kind == "legs_3d";
        return new Quantities()
            .Add("t", () => line.Time.InSeconds)
            .Add("tau", () => line.ProperTime.InSeconds)
            .Add("t_minus_tau", () => line.BehindInSeconds)
            .Add("displacement", () => isVector
                ? [line.Displacement.XInMetres, line.Displacement.YInMetres, line.Displacement.ZInMetres]
                : [line.Displacement.XInMetres]);
    }

    private static Quantities Rates(ClockRate<Sled, FarClock> rate)
        => new Quantities().Add("rate", () => rate.Rate).Add("rate_minus_1", () => rate.MinusOne);

    private static Quantities Pair(ClockRate<Sled, Yard> pair)
        => new Quantities().Add("ratio_minus_1", () => pair.MinusOne).Add("microseconds_per_day", () => pair.GainInMicrosecondsPerDay);
}
