using System.Text;

namespace FrameSafe.Benchmarks.Analyzer;

/// <summary>Simulation code of any size, tagged or plain, for measuring what the analyzer costs a line.</summary>
internal static class GeneratedCode
{
    /// <summary>Files of tagged code, about <paramref name="lines"/> lines in all, 500 a file.</summary>
    public static IEnumerable<string> Tagged(int lines)
    {
        int files = lines / 500;
        for (int file = 0; file < files; file++)
            yield return File(file, tagged: true);
    }

    /// <summary>The same code without a tag.</summary>
    public static IEnumerable<string> Plain(int lines)
    {
        int files = lines / 500;
        for (int file = 0; file < files; file++)
            yield return File(file, tagged: false);
    }

    /// <summary>One method with a body of <paramref name="lines"/> lines.</summary>
    public static string LongMethod(int lines)
    {
        var text = new StringBuilder("using System;\nusing FrameSafe;\nnamespace Generated;\npublic static class LongOne\n{\n");
        text.AppendLine("    [return: Unit(\"m\")] public static double Run([Unit(\"m\")] double x0, [Unit(\"m/s\")] double v0, [Unit(\"s\")] double dt)\n    {");
        text.AppendLine("        double x = x0;\n        double v = v0;");
        for (int line = 0; line < lines; line++)
        {
            text.AppendLine((line % 5) switch
            {
                0 => $"        double step{line} = v * dt;",
                1 => $"        x = x + step{line - 1};",
                2 => $"        if (x < x0) v = v0 + v / 2;",
                3 => $"        double mean{line} = (x + x0) / 2;",
                _ => $"        x = Math.Max(x, mean{line - 1});",
            });
        }
        return text.AppendLine("        return x;\n    }\n}").ToString();
    }

    private static string File(int number, bool tagged)
    {
        string Tag(string unit, string frame = "Deck") => tagged ? $"[Unit(\"{unit}\")] [InFrame<{frame}>] " : "";
        string Scalar(string unit) => tagged ? $"[Unit(\"{unit}\")] " : "";
        var text = new StringBuilder("using System;\nusing System.Collections.Generic;\n");
        if (tagged)
            text.AppendLine("using FrameSafe;");
        text.AppendLine($"namespace Generated{number};");
        if (tagged)
            text.AppendLine("public readonly struct Deck : IInertialFrame;\n[RelativeTo<Deck>(MaxSpeed = 0.3)] public readonly struct Probe : IInertialFrame;");
        for (int type = 0; type < 16; type++)
        {
            text.AppendLine($$"""
                public sealed class Body{{type}}
                {
                    private const double LightSpeed = 299792458.0;
                    {{Tag("m")}}private double _place;
                    {{Tag("m/s")}}private double _speed;
                    {{Scalar("kg")}}private readonly double _mass = {{type + 1}}.0;
                    private readonly List<double> _log = new();

                    public Body{{type}}({{Tag("m")}}double place, {{Tag("m/s")}}double speed)
                    {
                        _place = place;
                        _speed = speed;
                    }

                    public void Step({{Tag("s")}}double dt, {{Tag("m/s2")}}double thrust)
                    {
                        double gain = thrust * dt;
                        _speed += gain;
                        _place += _speed * dt;
                        if (_place < 0)
                        {
                            _place = -_place;
                            _speed = -_speed;
                        }
                        for (int i = 0; i < 3; i++)
                        {
                            double half = dt / 2;
                            _place += _speed * half - thrust * half * half / 2;
                        }
                        _log.Add(_place);
                    }

                    public double Gamma() => 1 / Math.Sqrt((1 - _speed / LightSpeed) * (1 + _speed / LightSpeed));

                    public double Momentum() => Gamma() * _mass * _speed;
                }
                """);
        }
        return text.ToString();
    }
}
