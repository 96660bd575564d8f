namespace FrameSafe.Accuracy;

/// <summary>Energy, momentum, systems, decays, fields, light and spin.</summary>
internal static class ParticleQuantities
{
    internal static Quantities Energy(ReferenceCase given)
    {
        if (given.Kind == "si_v")
            return EnergyInSI(given);
        Mass mass = Mass.FromMegaelectronvoltsPerLightSpeedSquared(given.Number("mc2"));
        Momentum<Yard> momentum = default;
        KineticEnergy<Yard> kinetic;
        Velocity<Yard> velocity;
        switch (given.Kind)
        {
            case "T":
                kinetic = KineticEnergy<Yard>.FromMegaelectronvolts(given.Number("T"));
                velocity = Velocity<Yard>.FromLorentzFactorMinusOne(kinetic.LorentzFactorMinusOneOf(mass));
                momentum = Momentum<Yard>.Of(mass, kinetic);
                break;
            case "E":
                kinetic = TotalEnergy<Yard>.FromMegaelectronvolts(given.Number("E")).WithoutRestEnergyOf(mass);
                velocity = Velocity<Yard>.FromLorentzFactorMinusOne(kinetic.LorentzFactorMinusOneOf(mass));
                momentum = Momentum<Yard>.Of(mass, kinetic);
                break;
            case "pc":
                momentum = Momentum<Yard>.FromMegaelectronvoltsPerLightSpeed(given.Number("pc"));
                kinetic = momentum.KineticEnergyOf(mass);
                velocity = momentum.VelocityOf(mass);
                break;
            default:
                velocity = given.Kind == "beta"
                    ? Velocity<Yard>.FromSpeedRatio(given.Number("beta"))
                    : Velocity<Yard>.FromCelerityRatio(given.Number("celerity"));
                kinetic = KineticEnergy<Yard>.Of(mass, velocity);
                momentum = Momentum<Yard>.Of(mass, velocity);
                break;
        }

        return new Quantities()
            .Add("T", () => kinetic.InMegaelectronvolts)
            .Add("E", () => kinetic.WithRestEnergyOf(mass).InMegaelectronvolts)
            .Add("pc", () => momentum.InMegaelectronvoltsPerLightSpeed)
            .Add("gamma", () => velocity.LorentzFactor)
            .Add("gamma_minus_1", () => velocity.LorentzFactorMinusOne)
            .Add("beta", () => velocity.SpeedRatio)
            .Add("one_minus_beta", () => velocity.OneMinusSpeedRatio)
            .Add("celerity", () => velocity.CelerityRatio)
            .Add("rapidity", () => velocity.Rapidity);
    }

    internal static Quantities BoostFourMomentum(ReferenceCase given)
    {
        Boost<Yard, Sled> boost = Boost<Yard, Sled>.Into(MotionQuantities.VelocityOf<Yard>(given, "v"));
        bool isSI = given.Has("E_J");
        double[] p = given.Vector(isSI ? "p_kg_m_per_s" : "p");
        FourMomentum<Yard> momentum = isSI
            ? FourMomentum<Yard>.Of(TotalEnergy<Yard>.FromJoules(given.Number("E_J")), Momentum<Yard>.FromNewtonSeconds(p[0], p[1], p[2]))
            : FourMomentum<Yard>.FromMegaelectronvolts(given.Number("E"), p[0], p[1], p[2]);
        FourMomentum<Sled> carried = boost.Map(momentum);
        Momentum<Sled> out_ = carried.Momentum;
        return new Quantities()
            .Add("gamma_boost", () => boost.LorentzFactor.Value)
            .Add("E", () => carried.Energy.InMegaelectronvolts)
            .Add("E_J", () => carried.Energy.InJoules)
            .Add("p", () =>
            {
                (double x, double y, double z) = out_.InMegaelectronvoltsPerLightSpeedComponents;
                return [x, y, z];
            })
            .Add("p_kg_m_per_s", () => [out_.XInNewtonSeconds, out_.YInNewtonSeconds, out_.ZInNewtonSeconds])
            .Add("mass", () => momentum.InvariantMass().InMegaelectronvoltsPerLightSpeedSquared)
            .Add("mass_kg", () => momentum.InvariantMass().InKilograms)
            .Add("mass_squared", () => momentum.InvariantSquareInSquareMegaelectronvolts);
    }

    internal static Quantities Decay(ReferenceCase given)
    {
        Mass Of(string name) => Mass.FromMegaelectronvoltsPerLightSpeedSquared(given.Number(name));
        Mass first = Of("m1");
        Mass second = Of("m2");
        TwoBodyDecay<Yard> decay = TwoBodyDecay<Yard>.Of(Of("M"), first, second);
        Velocity<Yard> FirstVelocity() => Velocity<Yard>.FromLorentzFactorMinusOne(decay.FirstKineticEnergy.LorentzFactorMinusOneOf(first));
        Velocity<Yard> SecondVelocity() => Velocity<Yard>.FromLorentzFactorMinusOne(decay.SecondKineticEnergy.LorentzFactorMinusOneOf(second));
        Quantities quantities = new Quantities()
            .Add("p", () => decay.Momentum.InMegaelectronvoltsPerLightSpeed)
            .Add("E1", () => decay.FirstEnergy.InMegaelectronvolts)
            .Add("E2", () => decay.SecondEnergy.InMegaelectronvolts)
            .Add("T1", () => decay.FirstKineticEnergy.InMegaelectronvolts)
            .Add("T2", () => decay.SecondKineticEnergy.InMegaelectronvolts)
            .Add("Q", () => decay.Released.InMegaelectronvolts);
        if (first.InKilograms > 0)
        {
            quantities
                .Add("beta1", () => FirstVelocity().SpeedRatio)
                .Add("one_minus_beta1", () => FirstVelocity().OneMinusSpeedRatio)
                .Add("gamma1", () => FirstVelocity().LorentzFactor);
        }

        return second.InKilograms > 0 ? quantities.Add("beta2", () => SecondVelocity().SpeedRatio) : quantities;
    }

    internal static Quantities CentreOfMomentum(ReferenceCase given) => given.Kind switch
    {
        "fixed_target_T" => Target(given, KineticEnergy<Yard>.FromMegaelectronvolts(given.Number("T1")), null),
        "fixed_target_p" => Target(
            given, default, Momentum<Yard>.FromMegaelectronvoltsPerLightSpeed(given.Number("p1"))),
        "threshold" => Threshold(given),
        "collider" => Collider(given),
        "particles_mp" => System([.. given.Vector("m").Select(MassOf)], [.. given.Vectors("p").Select(MomentumOf)]),
        "particles_Ep" => System(given.Vector("E").Zip(given.Vectors("p"), Known).Aggregate((sum, next) => sum + next)),
        _ => new Quantities(),
    };

    internal static Quantities Light(ReferenceCase given)
    {
        Velocity<Yard> velocity = given.Has("beta")
            ? Velocity<Yard>.FromSpeedRatio(given.Number("beta"))
            : Velocity<Yard>.FromCelerityRatio(given.Number("celerity"));
        double angle = given.Number("theta");
        LightAtAngle<Yard, Sled> light = LightAtAngle<Yard, Sled>.At(velocity, angle);
        LightAtAngle<Sled, Yard> inverse = LightAtAngle<Yard, Sled>.AtAngleInOther(velocity, angle);
        return new Quantities()
            .Add("gamma", () => velocity.LorentzFactor)
            .Add("frequency_ratio", () => light.FrequencyRatio)
            .Add("frequency_ratio_minus_1", () => light.FrequencyRatioMinusOne)
            .Add("theta_prime", () => light.AngleInOther)
            .Add("cos_theta_prime", () => light.CosineInOther)
            .Add("aberration", () => light.Aberration)
            .Add("solid_angle_ratio", () => light.SolidAngleRatio)
            .Add("inverse_frequency_ratio", () => inverse.FrequencyRatio)
            .Add("inverse_theta", () => inverse.AngleInOther);
    }

    internal static Quantities Field(ReferenceCase given)
    {
        double[] e = given.Vector("E");
        double[] b = given.Vector("B");
        Boost<Yard, Sled> boost = Boost<Yard, Sled>.Into(MotionQuantities.VelocityOf<Yard>(given, "v"));
        ElectromagneticField<Yard> field = ElectromagneticField<Yard>.From((e[0], e[1], e[2]), (b[0], b[1], b[2]));
        ElectromagneticField<Sled> carried = boost.Map(field);
        return new Quantities()
            .Add("gamma", () => boost.LorentzFactor.Value)
            .Add("E", () => Parts(carried.ElectricInVoltsPerMetre))
            .Add("B", () => Parts(carried.MagneticInTeslas))
            .Add("E_dot_B", () => field.ElectricDotMagnetic)
            .Add("E2_minus_c2B2", () => field.SquareDifference);
    }

    internal static Quantities Spin(ReferenceCase given)
    {
        switch (given.Kind)
        {
            case "magic":
                Mass muon = Mass.FromMegaelectronvoltsPerLightSpeedSquared(given.Number("mc2"));
                SpinPrecession<Yard> spin = SpinPrecession<Yard>.Of(1, muon, given.Number("a"));
                Velocity<Yard> magic = Velocity<Yard>.FromCelerityRatio(1 / Math.Sqrt(given.Number("a")));
                return new Quantities()
                    .Add("gamma_magic", () => spin.MagicLorentzFactor())
                    .Add("celerity_magic", () => magic.CelerityRatio)
                    .Add("beta_magic", () => magic.SpeedRatio)
                    .Add("p_magic", () => Momentum<Yard>.Of(muon, magic).InMegaelectronvoltsPerLightSpeed);
            case "field":
                double[] b = given.Vector("B");
                double[] e = given.Vector("E");
                double[] motion = given.Vector(given.Has("beta") ? "beta" : "celerity");
                Velocity<Yard> velocity = given.Has("beta")
                    ? Velocity<Yard>.FromSpeedRatio(motion[0], motion[1], motion[2])
                    : Velocity<Yard>.FromCelerityRatio(motion[0], motion[1], motion[2]);
                SpinPrecession<Yard> particle = SpinPrecession<Yard>.Of(given.Number("q"), Mass.FromKilograms(given.Number("m")), given.Number("a"));
                ElectromagneticField<Yard> field = ElectromagneticField<Yard>.From((e[0], e[1], e[2]), (b[0], b[1], b[2]));
                return new Quantities()
                    .Add("gamma", () => velocity.LorentzFactor)
                    .Add("omega_spin", () => Parts(particle.OfSpin(velocity, field)))
                    .Add("omega_momentum_direction", () => Parts(particle.OfMotion(velocity, field)))
                    .Add("omega_relative", () => Parts(particle.OfSpinAgainstMotion(velocity, field)));
            case "perp":
                SpinPrecession<Yard> across = SpinPrecession<Yard>.Of(given.Number("q"), Mass.FromKilograms(given.Number("m")), given.Number("a"));
                double bend = given.Number("B");
                double gamma = given.Number("gamma");
                return new Quantities()
                    .Add("omega_cyclotron", () => across.CyclotronAngularVelocity(bend, gamma))
                    .Add("omega_spin", () => across.SpinAngularVelocity(bend, gamma))
                    .Add("omega_anomalous", () => across.AnomalousAngularVelocity(bend))
                    .Add("spin_tune", () => across.SpinTune(gamma));
            case "thomas":
                double[] a = given.Vector("acceleration");
                double[] v = given.Vector("v_m_per_s");
                Velocity<Yard> moving = Velocity<Yard>.FromMetresPerSecond(v[0], v[1], v[2]);
                return new Quantities()
                    .Add("gamma", () => moving.LorentzFactor)
                    .Add("omega_thomas", () => Parts(SpinPrecession<Yard>.Thomas(moving, (a[0], a[1], a[2]))));
            default:
                return new Quantities();
        }
    }

    private static Quantities EnergyInSI(ReferenceCase given)
    {
        Mass mass = Mass.FromKilograms(given.Number("mass_kg"));
        Velocity<Yard> velocity = Velocity<Yard>.FromMetresPerSecond(given.Number("v_m_per_s"));
        KineticEnergy<Yard> kinetic = KineticEnergy<Yard>.Of(mass, velocity);
        return new Quantities()
            .Add("gamma", () => velocity.LorentzFactor)
            .Add("gamma_minus_1", () => velocity.LorentzFactorMinusOne)
            .Add("kinetic_energy_J", () => kinetic.InJoules)
            .Add("rest_energy_J", () => mass.RestEnergyInJoules)
            .Add("total_energy_J", () => kinetic.WithRestEnergyOf(mass).InJoules)
            .Add("momentum_kg_m_per_s", () => Momentum<Yard>.Of(mass, velocity).XInNewtonSeconds);
    }

    private static Quantities Target(ReferenceCase given, KineticEnergy<Yard> energy, Momentum<Yard>? momentum)
    {
        Mass beam = MassOf(given.Number("m1"));
        Mass target = MassOf(given.Number("m2"));
        KineticEnergy<Yard> kinetic = momentum?.KineticEnergyOf(beam) ?? energy;
        FourMomentum<Yard> system = momentum is { } known
            ? FourMomentum<Yard>.Of(beam, known) + FourMomentum<Yard>.Of(target, default(Momentum<Yard>))
            : FixedTarget.System(beam, energy, target);
        Velocity<Yard> centre = system.Velocity();
        return new Quantities()
            .Add("s", () => system.InvariantSquareInSquareMegaelectronvolts)
            .Add("sqrt_s", () => system.InvariantMass().InMegaelectronvoltsPerLightSpeedSquared)
            .Add("sqrt_s_minus_masses", () => FixedTarget.Available(beam, kinetic, target).InMegaelectronvolts)
            .Add("p_star", () => FixedTarget.CentreMomentum(beam, kinetic, target).InMegaelectronvoltsPerLightSpeed)
            .Add("gamma_cm", () => centre.LorentzFactor)
            .Add("gamma_cm_minus_1", () => centre.LorentzFactorMinusOne)
            .Add("beta_cm", () => centre.SpeedRatio)
            .Add("one_minus_beta_cm", () => centre.OneMinusSpeedRatio)
            .Add("p1", () => (momentum ?? Momentum<Yard>.Of(beam, kinetic)).InMegaelectronvoltsPerLightSpeed)
            .Add("E1", () => kinetic.WithRestEnergyOf(beam).InMegaelectronvolts)
            .Add("T1", () => kinetic.InMegaelectronvolts);
    }

    private static Quantities Threshold(ReferenceCase given)
    {
        Mass beam = MassOf(given.Number("m1"));
        KineticEnergy<Yard> least = FixedTarget.Threshold<Yard>(beam, MassOf(given.Number("m2")), MassOf(given.Number("sum_final")));
        return new Quantities()
            .Add("T1_threshold", () => least.InMegaelectronvolts)
            .Add("E1_threshold", () => least.WithRestEnergyOf(beam).InMegaelectronvolts)
            .Add("p1_threshold", () => Momentum<Yard>.Of(beam, least).InMegaelectronvoltsPerLightSpeed)
            .Add("sqrt_s", () => given.Number("sum_final"));
    }

    private static Quantities Collider(ReferenceCase given)
    {
        double half = given.Number("crossing_angle") / 2;
        double p1 = given.Number("p1");
        double p2 = given.Number("p2");
        return System(
            [MassOf(given.Number("m1")), MassOf(given.Number("m2"))],
            [MomentumOf([p1 * Math.Sin(half), 0, p1 * Math.Cos(half)]), MomentumOf([p2 * Math.Sin(half), 0, -p2 * Math.Cos(half)])]);
    }

    private static Quantities System(Mass[] masses, Momentum<Yard>[] momenta)
        => System(ParticleSystem.Total<Yard>(masses, momenta))
            .Add("invariant_mass_minus_masses", () => ParticleSystem.AvailableInMegaelectronvolts<Yard>(masses, momenta));

    private static Quantities System(FourMomentum<Yard> whole)
    {
        (double X, double Y, double Z) total = whole.Momentum.InMegaelectronvoltsPerLightSpeedComponents;
        return new Quantities()
            .Add("E_total", () => whole.Energy.InMegaelectronvolts)
            .Add("p_total", () => [total.X, total.Y, total.Z])
            .Add("s", () => whole.InvariantSquareInSquareMegaelectronvolts)
            .Add("invariant_mass", () => whole.InvariantMass().InMegaelectronvoltsPerLightSpeedSquared)
            .Add("gamma_cm", () => whole.Velocity().LorentzFactor)
            .Add("gamma_cm_minus_1", () => whole.Velocity().LorentzFactorMinusOne)
            .Add("beta_cm", () => Parts(whole.Velocity()));
    }

    private static Mass MassOf(double mass) => Mass.FromMegaelectronvoltsPerLightSpeedSquared(mass);

    private static Momentum<Yard> MomentumOf(double[] p) => Momentum<Yard>.FromMegaelectronvoltsPerLightSpeed(p[0], p[1], p[2]);

    private static FourMomentum<Yard> Known(double energy, double[] p)
        => FourMomentum<Yard>.FromMegaelectronvolts(energy, p[0], p[1], p[2]);

    private static double[] Parts((double X, double Y, double Z) value) => [value.X, value.Y, value.Z];

    private static double[] Parts(Velocity<Yard> velocity) => [velocity.XRatio, velocity.YRatio, velocity.ZRatio];
}
