using FrameSafe.Analyzers.Tests.Verify;
using FrameSafe.CodeFixes;

namespace FrameSafe.Analyzers.Tests.Repairs;

/// <summary>Each repair: the plain case, with trivia, nested, all at once, and one where nothing may be offered.</summary>
public sealed class RepairTests
{
    [Fact]
    public Task A_unit_is_converted_where_the_target_wants_it_and_comments_stay()
        => Mended.ByAsync<ConvertUnit>(
            """
                [return: Unit("m")]
                static double Right([Unit("m")] double near, [Unit("km")] double far)
                    => {|FRAME401:near + /* the far one */ far|}; // in all

                [return: Unit("m")]
                static double Left([Unit("m")] double near, [Unit("km")] double far) => {|FRAME401:far - near|};

                [return: Unit("km")]
                static double Wanted([Unit("m")] double near, [Unit("km")] double far) => {|FRAME401:near + far|};

                static void Step([Unit("m")] double x, [Unit("km")] double dx) => {|FRAME401:x += dx|};
            """,
            """
                [return: Unit("m")]
                static double Right([Unit("m")] double near, [Unit("km")] double far)
                    => near + /* the far one */ far * 1000; // in all

                [return: Unit("m")]
                static double Left([Unit("m")] double near, [Unit("km")] double far) => far * 1000 - near;

                [return: Unit("km")]
                static double Wanted([Unit("m")] double near, [Unit("km")] double far) => near / 1000 + far;

                static void Step([Unit("m")] double x, [Unit("km")] double dx) => x += dx * 1000;
            """);

    [Fact]
    public Task An_argument_is_converted_in_its_own_type()
        => Mended.ByAsync<ConvertUnit>(
            """
                static double Of([Unit("m")] double x) => x;
                static float OfSingle([Unit("s")] float t) => t;
                static double Sum([Unit("km")] double a, [Unit("km")] double b) => Of({|FRAME402:a + b|});
                static double Integer([Unit("mm")] int millimetres) => Of({|FRAME402:millimetres|});
                static float Single([Unit("h")] float hours) => OfSingle({|FRAME402:hours|});
                static double Sine([Unit("deg")] double angle) => Math.Sin({|FRAME404:angle|});
            """,
            """
                static double Of([Unit("m")] double x) => x;
                static float OfSingle([Unit("s")] float t) => t;
                static double Sum([Unit("km")] double a, [Unit("km")] double b) => Of((a + b) * 1000);
                static double Integer([Unit("mm")] int millimetres) => Of(millimetres / 1000.0);
                static float Single([Unit("h")] float hours) => OfSingle(hours * 3600);
                static double Sine([Unit("deg")] double angle) => Math.Sin(angle * (Math.PI / 180));
            """);

    [Fact]
    public Task A_vector_is_not_converted_for_it_has_no_such_factor()
        => Mended.NotByAsync<ConvertUnit>(
            """
                static double Of([Unit("m")] double[] places) => places[0];
                static double Wrong([Unit("km")] double[] places) => Of({|FRAME402:places|});
            """);

    [Fact]
    public Task The_lorentz_factor_is_swapped_on_either_side()
        => Mended.ByAsync<SwapLorentzFactor>(
            """
                [return: Unit("s"), OnClock<Tug>]
                static double Right([Unit("s"), InFrame<Harbour>] double time, [Kind(QuantityKind.LorentzFactor), Between<Harbour, Tug>] double gamma)
                    => {|FRAME202:time * gamma|};

                [return: Unit("s"), OnClock<Tug>]
                static double Left([Unit("s"), InFrame<Harbour>] double time, [Kind(QuantityKind.LorentzFactor), Between<Harbour, Tug>] double gamma)
                    => {|FRAME202:gamma /* of the tug */ * time|};

                [return: Unit("s"), InFrame<Harbour>]
                static double Back([Unit("s"), OnClock<Tug>] double reading, [Kind(QuantityKind.LorentzFactor), Between<Harbour, Tug>] double gamma)
                    => {|FRAME202:reading / gamma|};
            """,
            """
                [return: Unit("s"), OnClock<Tug>]
                static double Right([Unit("s"), InFrame<Harbour>] double time, [Kind(QuantityKind.LorentzFactor), Between<Harbour, Tug>] double gamma)
                    => time / gamma;

                [return: Unit("s"), OnClock<Tug>]
                static double Left([Unit("s"), InFrame<Harbour>] double time, [Kind(QuantityKind.LorentzFactor), Between<Harbour, Tug>] double gamma)
                    => time /* of the tug */ / gamma;

                [return: Unit("s"), InFrame<Harbour>]
                static double Back([Unit("s"), OnClock<Tug>] double reading, [Kind(QuantityKind.LorentzFactor), Between<Harbour, Tug>] double gamma)
                    => reading * gamma;
            """);

    [Fact]
    public Task A_lorentz_factor_out_of_sight_is_not_swapped()
        => Mended.NotByAsync<SwapLorentzFactor>(
            """
                [return: Unit("s"), OnClock<Tug>]
                static double Far([Unit("s"), InFrame<Harbour>] double time, [Kind(QuantityKind.LorentzFactor), Between<Harbour, Tug>] double gamma)
                {
                    double product = time * gamma;
                    return {|FRAME202:product|};
                }
            """);

    [Fact]
    public Task Collinear_velocities_are_composed_with_the_projects_own_constant()
        => Mended.ByAsync<ComposeVelocities>(
            """
                [Unit("m/s")] private const double LightSpeed = 299792458.0;

                [return: Unit("m/s"), InFrame<Harbour>]
                static double Sum([Unit("m/s"), InFrame<Harbour>] double tug, [Unit("m/s"), InFrame<Tug>] double drone)
                    => {|FRAME301:tug + drone|}; // of both

                [return: Unit("m/s"), InFrame<Harbour>]
                static double Half([Unit("m/s"), InFrame<Harbour>] double tug, [Unit("m/s"), InFrame<Tug>] double drone)
                    => 0.5 * ({|FRAME301:tug - drone|});

                static void Step([Unit("m/s"), InFrame<Harbour>] double tug, [Unit("m/s"), InFrame<Tug>] double drone)
                {
                    {|FRAME301:tug += drone|};
                }
            """,
            """
                [Unit("m/s")] private const double LightSpeed = 299792458.0;

                [return: Unit("m/s"), InFrame<Harbour>]
                static double Sum([Unit("m/s"), InFrame<Harbour>] double tug, [Unit("m/s"), InFrame<Tug>] double drone)
                    => (tug + drone) / (1 + tug / LightSpeed * (drone / LightSpeed)); // of both

                [return: Unit("m/s"), InFrame<Harbour>]
                static double Half([Unit("m/s"), InFrame<Harbour>] double tug, [Unit("m/s"), InFrame<Tug>] double drone)
                    => 0.5 * ((tug - drone) / (1 - tug / LightSpeed * (drone / LightSpeed)));

                static void Step([Unit("m/s"), InFrame<Harbour>] double tug, [Unit("m/s"), InFrame<Tug>] double drone)
                {
                    tug = (tug + drone) / (1 + tug / LightSpeed * (drone / LightSpeed));
                }
            """);

    [Fact]
    public Task Velocities_that_calls_give_are_not_called_twice()
        => Mended.NotByAsync<ComposeVelocities>(
            """
                [return: Unit("m/s"), InFrame<Tug>]
                static double Next() => 0;

                [return: Unit("m/s"), InFrame<Harbour>]
                static double Sum([Unit("m/s"), InFrame<Harbour>] double tug) => {|FRAME301:tug + Next()|};
            """);

    [Fact]
    public Task A_number_is_carried_over_by_a_method_that_says_so()
        => Mended.ByAsync<CarryNumber>(
            """
                [Carries<Tug, Harbour>]
                [return: Unit("m"), InFrame<Harbour>]
                static double AlongTrack([Unit("m"), InFrame<Tug>] double offset) => offset / 2;

                [Carries<Tug, Harbour>]
                [return: Unit("J"), InFrame<Harbour>]
                static double Energy([Unit("J"), InFrame<Tug>] double energy) => energy / 2;

                [return: Unit("m"), InFrame<Harbour>]
                static double Sum([Unit("m"), InFrame<Harbour>] double tug, [Unit("m"), InFrame<Tug>] double ahead)
                    => {|FRAME101:tug + /* measured aboard */ ahead|};

                [return: Unit("m"), InFrame<Harbour>]
                static double Plain([Unit("m"), InFrame<Tug>] double ahead) => {|FRAME102:ahead|};
            """,
            """
                [Carries<Tug, Harbour>]
                [return: Unit("m"), InFrame<Harbour>]
                static double AlongTrack([Unit("m"), InFrame<Tug>] double offset) => offset / 2;

                [Carries<Tug, Harbour>]
                [return: Unit("J"), InFrame<Harbour>]
                static double Energy([Unit("J"), InFrame<Tug>] double energy) => energy / 2;

                [return: Unit("m"), InFrame<Harbour>]
                static double Sum([Unit("m"), InFrame<Harbour>] double tug, [Unit("m"), InFrame<Tug>] double ahead)
                    => tug + /* measured aboard */ AlongTrack(ahead);

                [return: Unit("m"), InFrame<Harbour>]
                static double Plain([Unit("m"), InFrame<Tug>] double ahead) => AlongTrack(ahead);
            """);

    [Fact]
    public Task A_transform_of_another_way_carries_nothing()
        => Mended.NotByAsync<CarryNumber>(
            """
                [Carries<Harbour, Tug>]
                [return: Unit("m"), InFrame<Tug>]
                static double Aboard([Unit("m"), InFrame<Harbour>] double offset) => offset / 2;

                [return: Unit("m"), InFrame<Harbour>]
                static double Plain([Unit("m"), InFrame<Tug>] double ahead) => {|FRAME102:ahead|};
            """);

    [Fact]
    public Task Proper_and_coordinate_time_go_through_the_factor_in_scope()
        => Mended.ByAsync<ApplyLorentzFactor>(
            """
                [return: Unit("s"), InFrame<Harbour>]
                static double Since(
                    [Unit("s"), InFrame<Harbour>] double now,
                    [Unit("s"), OnClock<Tug>] double released,
                    [Kind(QuantityKind.LorentzFactor), Between<Harbour, Drone>] double other,
                    [Kind(QuantityKind.LorentzFactor), Between<Harbour, Tug>] double gamma)
                    => {|FRAME201:now - released|}; // as the harbour counts

                [return: Unit("s"), OnClock<Tug>]
                static double Aboard(
                    [Unit("s"), InFrame<Harbour>] double now,
                    [Kind(QuantityKind.LorentzFactor), Between<Harbour, Tug>] double gamma) => {|FRAME201:now|};
            """,
            """
                [return: Unit("s"), InFrame<Harbour>]
                static double Since(
                    [Unit("s"), InFrame<Harbour>] double now,
                    [Unit("s"), OnClock<Tug>] double released,
                    [Kind(QuantityKind.LorentzFactor), Between<Harbour, Drone>] double other,
                    [Kind(QuantityKind.LorentzFactor), Between<Harbour, Tug>] double gamma)
                    => now - released * gamma; // as the harbour counts

                [return: Unit("s"), OnClock<Tug>]
                static double Aboard(
                    [Unit("s"), InFrame<Harbour>] double now,
                    [Kind(QuantityKind.LorentzFactor), Between<Harbour, Tug>] double gamma) => now / gamma;
            """);

    [Fact]
    public Task Without_a_factor_between_the_two_none_is_applied()
        => Mended.NotByAsync<ApplyLorentzFactor>(
            """
                [return: Unit("s"), InFrame<Harbour>]
                static double Since(
                    [Unit("s"), InFrame<Harbour>] double now,
                    [Unit("s"), OnClock<Tug>] double released,
                    [Kind(QuantityKind.LorentzFactor), Between<Harbour, Drone>] double other) => {|FRAME201:now - released|};
            """);

    [Fact]
    public Task Newtonian_forms_become_relativistic_ones()
        => Mended.ByAsync<NewtonianToRelativistic>(
            """
                [Unit("m/s")] private const double C = 299792458.0;

                static double Energy([Unit("kg")] double m, [Unit("m/s"), InFrame<Harbour>] double v) => {|FRAME303:0.5 * m * v * v|}; // of one

                static double Momentum([Unit("kg")] double m, [Unit("m/s"), InFrame<Harbour>] double v) => {|FRAME303:v * m|};
            """,
            """
                [Unit("m/s")] private const double C = 299792458.0;

                static double Energy([Unit("kg")] double m, [Unit("m/s"), InFrame<Harbour>] double v) => m * v * v / (Math.Sqrt((1 - v / C) * (1 + v / C)) * (1 + Math.Sqrt((1 - v / C) * (1 + v / C)))); // of one

                static double Momentum([Unit("kg")] double m, [Unit("m/s"), InFrame<Harbour>] double v) => m * v / Math.Sqrt((1 - v / C) * (1 + v / C));
            """);

    [Fact]
    public Task Flawed_and_lossy_forms_become_the_known_ones()
        => Mended.ByAsync<WriteKnownForm>(
            """
                [Unit("m/s")] private const double C = 299792458.0;

                static double Gamma([Unit("m/s"), InFrame<Harbour>] double v) => {|FRAME302:1 / Math.Sqrt(1 - v * v / C)|}; // of the tug

                static double Excess([Unit("m/s"), InFrame<Harbour>, MaxSpeed(0.01)] double v) => {|FRAME501:C / Math.Sqrt(C * C - v * v) - 1|};
            """,
            """
                [Unit("m/s")] private const double C = 299792458.0;

                static double Gamma([Unit("m/s"), InFrame<Harbour>] double v) => 1 / Math.Sqrt((1 - v / C) * (1 + v / C)); // of the tug

                static double Excess([Unit("m/s"), InFrame<Harbour>, MaxSpeed(0.01)] double v) => v / C * (v / C) / (Math.Sqrt((1 - v / C) * (1 + v / C)) * (1 + Math.Sqrt((1 - v / C) * (1 + v / C))));
            """);

    [Fact]
    public Task A_rounded_constant_becomes_exact_in_its_own_unit()
        => Mended.ByAsync<WriteExactConstant>(
            """
                [Unit("m/s")] private const double C = {|FRAME502:3e8|}; // of light
                [Unit("km/s")] private const double Kilometres = {|FRAME502:299800.0|};
            """,
            """
                [Unit("m/s")] private const double C = 299792458.0; // of light
                [Unit("km/s")] private const double Kilometres = 299792.458;
            """);

    [Fact]
    public Task A_quantity_is_expressed_in_the_other_frame_by_the_boost_in_scope()
        => Mended.ByAsync<CarryQuantity>(
            """
                static SeparationRate<Harbour> Direct(Velocity<Harbour> tug, Velocity<Tug> drone, Boost<Tug, Harbour> boost)
                    => {|CS0019:tug - drone|}; // closing

                static SeparationRate<Harbour> Inverse(Velocity<Harbour> tug, Velocity<Tug> drone, Boost<Harbour, Tug> boost)
                    => {|CS0019:tug - drone|};

                static void Passed(Velocity<Tug> drone, Boost<Tug, Harbour> boost) => Take({|CS1503:drone|});

                static Velocity<Harbour> Returned(Velocity<Tug> drone, Boost<Tug, Harbour> boost) => {|CS0029:drone|};

                static void Take(Velocity<Harbour> velocity) { }
            """,
            """
                static SeparationRate<Harbour> Direct(Velocity<Harbour> tug, Velocity<Tug> drone, Boost<Tug, Harbour> boost)
                    => tug - boost.Map(drone); // closing

                static SeparationRate<Harbour> Inverse(Velocity<Harbour> tug, Velocity<Tug> drone, Boost<Harbour, Tug> boost)
                    => tug - boost.Inverse.Map(drone);

                static void Passed(Velocity<Tug> drone, Boost<Tug, Harbour> boost) => Take(boost.Map(drone));

                static Velocity<Harbour> Returned(Velocity<Tug> drone, Boost<Tug, Harbour> boost) => boost.Map(drone);

                static void Take(Velocity<Harbour> velocity) { }
            """);

    [Fact]
    public Task Without_a_boost_nothing_is_expressed()
        => Mended.NotByAsync<CarryQuantity>(
            """
                static SeparationRate<Harbour> None(Velocity<Harbour> tug, Velocity<Tug> drone) => {|CS0019:tug - drone|};
            """);

    [Fact]
    public Task A_unit_text_is_replaced_by_the_nearest_one()
        => Mended.ByAsync<CorrectUnitText>(
            """
                static double Of([Unit("{|FRAME405:kM|}")] double x) => x;
            """,
            """
                static double Of([Unit("km")] double x) => x;
            """);
}
