using System.Text;

namespace FrameSafe.Analyzers.Tests.Robustness;

/// <summary>Generates tagged C# of all constructs; it need not mean anything, nor always compile.</summary>
internal sealed class Programs(int seed)
{
    private static readonly string[] Units = ["m", "km", "s", "ms", "m/s", "km/s", "kg", "J", "MeV", "1", "deg", "rad", "[c]", "GeV [c=1]", "qwe", ""];
    private static readonly string[] Frames = ["Harbour", "Tug", "Drone", "Barge", "Buoy"];
    private static readonly string[] Kinds = ["Velocity", "Celerity", "LorentzFactor", "KineticEnergy", "TotalEnergy", "ProperLength", "SeparationRate", "Rapidity"];
    private static readonly string[] Functions = ["Math.Sqrt", "Math.Sin", "Math.Exp", "Math.Abs", "Math.Log", "double.Cbrt", "Math.Cos"];
    private static readonly string[] Pairs = ["Math.Max", "Math.Min", "Math.Atan2", "Math.Pow", "double.Hypot"];
    private readonly Random _random = new(seed);
    private readonly StringBuilder _text = new();
    private readonly List<string> _variables = [];
    private int _names;

    internal string Next()
    {
        _text.Clear();
        _text.AppendLine("public partial class Generated<T> where T : INumber<T> {");
        int members = _random.Next(2, 6);
        for (int i = 0; i < members; i++)
            Member(i);
        _text.AppendLine("}");
        return _text.ToString();
    }

    private void Member(int index)
    {
        _variables.Clear();
        switch (_random.Next(5))
        {
            case 0:
                _text.AppendLine($"{Tags()} private double _f{index} = {Literal()};");
                break;
            case 1:
                _text.AppendLine($"{Tags()} public double P{index} {{ get; set; }} = {Literal()};");
                break;
            case 2:
                _text.AppendLine($"public record struct R{index}({Tags()} double X, {Tags()} double Y) {{ public double Z => {With(["X", "Y"], 2)}; }}");
                break;
            default:
                Method(index);
                break;
        }
    }

    private void Method(int index)
    {
        _text.Append($"{Tags("return: ")} {(_random.Next(6) == 0 ? "async Task<double>" : "static double")} M{index}(");
        int parameters = _random.Next(0, 5);
        for (int i = 0; i < parameters; i++)
        {
            string modifier = _random.Next(10) switch { 0 => "ref ", 1 => "in ", _ => "" };
            _text.Append($"{(i == 0 ? "" : ", ")}{Tags()} {modifier}double p{i}");
            _variables.Add("p" + i);
        }

        _text.Append($"{(parameters == 0 ? "" : ", ")}{Tags()} double[] a) {{");
        _variables.Add("a[0]");
        Block(3);
        _text.AppendLine($"return {Expression(3)}; }}");
    }

    private void Block(int depth)
    {
        int before = _variables.Count;
        int statements = _random.Next(1, 5);
        for (int i = 0; i < statements; i++)
            Statement(depth);
        _variables.RemoveRange(before, _variables.Count - before);
    }

    private void Statement(int depth)
    {
        int choice = depth <= 0 ? _random.Next(4) : _random.Next(16);
        switch (choice)
        {
            case 0 or 1:
                string value = Expression(3);
                string name = "v" + _names++;
                _text.AppendLine($"{(_random.Next(2) == 0 ? "var" : "double")} {name} = {value};");
                _variables.Add(name);
                break;
            case 2:
                _text.AppendLine($"{Pick(_variables)} {Pick(["=", "+=", "-=", "*=", "/=", "%="])} {Expression(2)};");
                break;
            case 3:
                _text.AppendLine($"{Pick(_variables)}{Pick(["++", "--"])};");
                break;
            case 4:
                _text.Append($"if ({Condition()}) {{");
                Block(depth - 1);
                _text.Append("} else {");
                Block(depth - 1);
                _text.AppendLine("}");
                break;
            case 5:
                string counter = "i" + _names++;
                _text.Append($"for (int {counter} = 0; {counter} < 3; {counter}++) {{");
                Block(depth - 1);
                _text.AppendLine(_random.Next(3) == 0 ? "continue; }" : "}");
                break;
            case 6:
                _text.Append($"while ({Condition()}) {{");
                Block(depth - 1);
                _text.AppendLine(_random.Next(2) == 0 ? "break; }" : "}");
                break;
            case 7:
                string element = "e" + _names++;
                _text.Append($"foreach (var {element} in a) {{");
                _variables.Add(element);
                Block(depth - 1);
                _variables.Remove(element);
                _text.AppendLine("}");
                break;
            case 8:
                _text.Append("try {");
                Block(depth - 1);
                _text.Append("} catch (Exception) {");
                Block(depth - 1);
                _text.Append("} finally {");
                Block(depth - 1);
                _text.AppendLine("}");
                break;
            case 9:
                _text.Append($"switch ({Expression(1)}) {{ case > 1.0: ");
                Block(depth - 1);
                _text.Append("break; case < 0: return 0; default: ");
                Block(depth - 1);
                _text.AppendLine("break; }");
                break;
            case 10:
                string function = "L" + _names++;
                _text.AppendLine($"double {function}({Tags()} double q) {{ return {With([.. _variables, "q"], 2)}; }}");
                _variables.Add($"{function}({Expression(1)})");
                break;
            case 11:
                string lambda = "f" + _names++;
                _text.AppendLine($"Func<double, double> {lambda} = x => {With([.. _variables, "x"], 2)};");
                _variables.Add($"{lambda}({Expression(1)})");
                break;
            case 12:
                (string first, string second) = ("t" + _names++, "t" + _names++);
                _text.AppendLine($"var ({first}, {second}) = ({Expression(2)}, {Expression(2)});");
                _variables.Add(first);
                _variables.Add(second);
                break;
            case 13:
                _text.AppendLine($"checked {{ {Pick(_variables)} = {Expression(2)}; }}");
                break;
            case 14:
                string alias = "r" + _names++;
                _text.AppendLine($"ref double {alias} = ref a[1]; {alias} = {Expression(1)};");
                break;
            default:
                _text.AppendLine($"goto L{_names}; L{_names++}: ;");
                break;
        }
    }

    private string Condition() => $"{Expression(2)} {Pick(["<", ">", "<=", "==", "!="])} {Expression(2)}";

    private string With(List<string> variables, int depth)
    {
        List<string> mine = [.. _variables];
        _variables.Clear();
        _variables.AddRange(variables);
        string expression = Expression(depth);
        _variables.Clear();
        _variables.AddRange(mine);
        return expression;
    }

    private string Expression(int depth)
    {
        if (depth <= 0)
            return _random.Next(3) == 0 || _variables.Count == 0 ? Literal() : Pick(_variables);
        return _random.Next(14) switch
        {
            0 or 1 or 2 or 3 => $"({Expression(depth - 1)} {Pick(["+", "-", "*", "/", "%"])} {Expression(depth - 1)})",
            4 => $"{Pick(Functions)}({Expression(depth - 1)})",
            5 => $"{Pick(Pairs)}({Expression(depth - 1)}, {Expression(depth - 1)})",
            6 => $"({Condition()} ? {Expression(depth - 1)} : {Expression(depth - 1)})",
            7 => $"({Expression(depth - 1)} switch {{ > 1.0 => {Expression(depth - 1)}, _ => {Expression(depth - 1)} }})",
            8 => $"new[] {{ {Expression(depth - 1)}, {Expression(depth - 1)} }}.Select(y => y * {Expression(depth - 1)}).Sum()",
            9 => $"a.Zip(a, (y, z) => y - z).{Pick(["Max", "Min", "Average", "Sum"])}()",
            10 => $"({Expression(depth - 1)}, {Expression(depth - 1)}).Item{_random.Next(1, 3)}",
            11 => $"(double)(float){Expression(depth - 1)}",
            12 => $"new Vector3((float){Expression(depth - 1)}, 0, 1).Length()",
            _ => $"-{Expression(depth - 1)}",
        };
    }

    private string Literal() => Pick(["0", "1", "2.0", "0.5", "1e3", "1000", "3.6", "299792458.0", "double.NaN", "Math.PI", "17.3", "1e-9"]);

    private string Tags(string target = "")
    {
        if (_random.Next(4) == 0)
            return "";
        string tags = $"[{target}Unit(\"{Pick(Units)}\")]";
        if (_random.Next(2) == 0)
            tags += _random.Next(2) == 0 ? $"[{target}InFrame<{Pick(Frames)}>]" : $"[{target}OnClock<{Pick(Frames)}>]";
        if (_random.Next(4) == 0)
            tags += $"[{target}Kind(QuantityKind.{Pick(Kinds)})]";
        if (_random.Next(6) == 0)
            tags += $"[{target}Between<{Pick(Frames)}, {Pick(Frames)}>]";
        if (_random.Next(8) == 0)
            tags += $"[{target}MaxSpeed({Pick(["0.1", "1e-6", "1.5"])})]";
        return tags;
    }

    private string Pick(IReadOnlyList<string> of) => of.Count == 0 ? "a[0]" : of[_random.Next(of.Count)];
}
