using System.Collections.Generic;
using System.Diagnostics.CodeAnalysis;
using System.Globalization;

namespace FrameSafe.Analyzers.Tags;

/// <summary>
/// One reading of one unit text, by recursive descent:
/// <code>
/// product = ["/"] power { ("·" | "." | "*" | "×" | "/" | space) power }
/// power   = factor [ exponent ]
/// factor  = "(" product ")" | "sqrt(" product ")" | "√" factor | number | "{" note "}" | symbol
/// exponent = raised figures | digits | ("^" | "**") integer | ("^" | "**") "(" integer "/" integer ")"
/// </code>
/// </summary>
internal sealed class UnitTextReader
{
    private const int MaxDepth = 16;
    private const int MaxPower = 99;

    private readonly string _text;
    private readonly List<KeyValuePair<UnitSymbol, Rational>> _symbols = [];
    private int _end;
    private int _at;
    private int _depth;
    private bool _numberSeen;
    private UnitTextError? _error;

    internal UnitTextReader(string text)
    {
        _text = text;
        _end = text.Length;
    }

    internal bool TryRead([NotNullWhen(true)] out Unit? unit, [NotNullWhen(false)] out UnitTextError? error)
    {
        unit = null;
        while (_end > 0 && char.IsWhiteSpace(_text[_end - 1]))
            _end--;
        NaturalSystem natural = TakeNaturalSystem();
        SkipSpace();
        Value? value = null;
        if (_at == _end)
        {
            Fail(UnitTextReason.Empty, _at, 0);
        }
        else if ((value = Product(Rational.One)) is not null && _at < _end)
        {
            Fail(UnitTextReason.UnexpectedCharacter, _at, 1);
        }

        error = _error;
        if (error is not null || value is null)
        {
            error ??= new(UnitTextReason.TooLarge, 0, _text.Length, _text);
            return false;
        }

        bool affine = false;
        foreach (KeyValuePair<UnitSymbol, Rational> symbol in _symbols)
            affine |= symbol.Key.IsAffine;
        if (affine && (_symbols.Count > 1 || _numberSeen || _symbols[0].Value != Rational.One))
        {
            UnitSymbol culprit = _symbols.Find(static s => s.Key.IsAffine).Key;
            error = new(UnitTextReason.Affine, _text.IndexOf(culprit.Text, System.StringComparison.Ordinal), culprit.Text.Length, culprit.Text, "K");
            return false;
        }

        (Dimension? dimension, Scale? scale) = NaturalSystems.Reduce(natural, value.Dimension, value.Scale);
        if (dimension is null || scale is null)
        {
            error = new(UnitTextReason.TooLarge, 0, _text.Length, _text);
            return false;
        }

        QuantityKind kind = natural == NaturalSystem.None ? ImpliedKinds.Of(_symbols, value.Dimension) : QuantityKind.Unspecified;
        unit = new Unit(dimension, scale, _text.Trim(), kind, natural, affine);
        return true;
    }

    private sealed record Value(Dimension Dimension, Scale Scale);

    private NaturalSystem TakeNaturalSystem()
    {
        foreach ((string suffix, NaturalSystem system) in new[]
        {
            ("[c=1]", NaturalSystem.LightSpeed),
            ("[c=ħ=1]", NaturalSystem.LightSpeedAndAction),
            ("[c=hbar=1]", NaturalSystem.LightSpeedAndAction),
        })
        {
            if (_end < suffix.Length || string.CompareOrdinal(_text, _end - suffix.Length, suffix, 0, suffix.Length) != 0)
                continue;
            _end -= suffix.Length;
            while (_end > 0 && char.IsWhiteSpace(_text[_end - 1]))
                _end--;
            return system;
        }

        return NaturalSystem.None;
    }

    private Value? Product(Rational sign)
    {
        if (++_depth > MaxDepth)
            return Fail(UnitTextReason.TooLarge, _at, 1);

        Value? product = null;
        SkipSpace();
        if (Peek == '/')
            product = new(Dimension.One, Scale.One);
        else if ((product = Power(sign)) is null)
            return null;

        int lastSolidus = -1;
        while (true)
        {
            int before = _at;
            SkipSpace();
            bool spaced = _at > before;
            bool divides = false;
            if (Peek is '/' or '÷' or '∕')
            {
                divides = true;
                lastSolidus = _at++;
            }
            else if (Peek is '·' or '⋅' or '.' or '*' or '×' or '•')
            {
                _at++;
            }
            else if (!spaced || !StartsFactor(Peek))
            {
                _at = spaced && _at == _end ? _at : before;
                break;
            }
            else if (lastSolidus >= 0)
            {
                return Fail(UnitTextReason.AmbiguousProduct, lastSolidus, _at + 1 - lastSolidus);
            }

            SkipSpace();
            Value? next = Power(divides ? -sign : sign);
            if (next is null)
                return null;
            product = divides
                ? Checked(product.Dimension / next.Dimension, product.Scale / next.Scale)
                : Checked(product.Dimension * next.Dimension, product.Scale * next.Scale);
            if (product is null)
                return null;
        }

        _depth--;
        return product;
    }

    private Value? Power(Rational sign)
    {
        int firstSymbol = _symbols.Count;
        int start = _at;
        Value? factor = Factor(sign);
        if (factor is null || Exponent() is not { } exponent)
            return null;
        if (!exponent.IsKnown || exponent > MaxPower || exponent < -MaxPower)
            return Fail(UnitTextReason.BadPower, start, _at - start);
        if (exponent == Rational.One)
            return factor;
        Raise(firstSymbol, exponent);
        return Checked(factor.Dimension.Pow(exponent), factor.Scale.Pow(exponent));
    }

    private Value? Factor(Rational sign)
    {
        if (_at == _end)
            return Fail(UnitTextReason.MissingUnit, _at, 0);
        char c = Peek;
        if (c == '(')
            return Parenthesis(sign);
        if (c == '√' || LooksAt("sqrt("))
        {
            _at += c == '√' ? 1 : 4;
            int firstSymbol = _symbols.Count;
            if (++_depth > MaxDepth)
                return Fail(UnitTextReason.TooLarge, _at, 1);
            Value? radicand = Factor(sign);
            _depth--;
            Raise(firstSymbol, Rational.Half);
            return radicand is null ? null : Checked(radicand.Dimension.Pow(Rational.Half), radicand.Scale.Pow(Rational.Half));
        }

        if (c is >= '0' and <= '9')
            return Number();
        if (c == '{')
        {
            int close = _text.IndexOf('}', _at, _end - _at);
            if (close < 0)
                return Fail(UnitTextReason.MissingParenthesis, _at, _end - _at);
            _at = close + 1;
            return new(Dimension.One, Scale.One);
        }

        return Symbol(sign);
    }

    private Value? Parenthesis(Rational sign)
    {
        int open = _at++;
        Value? inner = Product(sign);
        if (inner is null)
            return null;
        SkipSpace();
        if (Peek != ')')
            return Fail(UnitTextReason.MissingParenthesis, open, _at - open);
        _at++;
        return inner;
    }

    private Value? Symbol(Rational sign)
    {
        int start = _at;
        string symbol = TakeSymbol();
        if (symbol.Length == 0)
            return Fail(UnitTextReason.UnexpectedCharacter, _at, 1);
        if (UnitTable.TryFind(symbol, out UnitSymbol? unit))
        {
            _symbols.Add(new(unit, sign));
            return new(unit.Dimension, unit.Scale);
        }

        return UnitTable.IsLogarithmic(symbol)
            ? Fail(UnitTextReason.Logarithmic, start, symbol.Length)
            : Fail(UnitTextReason.UnknownSymbol, start, symbol.Length, UnitTable.Nearest(symbol));
    }

    private string TakeSymbol()
    {
        int start = _at;
        if (Peek is '°')
        {
            _at++;
            if (Peek is 'C' or 'F')
                _at++;
        }
        else if (Peek is '\'' && _at + 1 < _end && _text[_at + 1] == '\'')
        {
            _at += 2;
        }
        else if (Peek is '\'' or '"' or '′' or '″' or '%' or '‰')
        {
            _at++;
        }
        else
        {
            while (_at < _end && (char.IsLetter(Peek) || Peek == '_'))
                _at++;
            if (Peek == '[')
            {
                int close = _text.IndexOf(']', _at, _end - _at);
                _at = close < 0 ? _end : close + 1;
            }
        }

        // The micro sign, and the two signs of Ohm and Ångström that have characters of their own.
        return _text.Substring(start, _at - start).Replace('μ', 'µ').Replace('\u2126', 'Ω').Replace('\u212B', 'Å');
    }

    private Value? Number()
    {
        int start = _at;
        _numberSeen = true;
        TakeDigits();
        if (Peek == '.' && IsDigit(_at + 1))
        {
            _at++;
            TakeDigits();
        }

        if (Peek is 'e' or 'E' && (IsDigit(_at + 1) || (_at + 1 < _end && _text[_at + 1] is '+' or '-' && IsDigit(_at + 2))))
        {
            _at += 2;
            TakeDigits();
        }

        string number = _text.Substring(start, _at - start);
        // UCUM's power of ten, 10*3 or 10^3; the latter is read as any other power.
        if (number == "10" && Peek == '*' && (IsDigit(_at + 1) || (_at + 1 < _end && _text[_at + 1] is '+' or '-')))
        {
            _at++;
            int sign = _at;
            if (Peek is '+' or '-')
                _at++;
            TakeDigits();
            if (!int.TryParse(_text.Substring(sign, _at - sign), NumberStyles.AllowLeadingSign, CultureInfo.InvariantCulture, out int ten)
                || ten is < -MaxPower or > MaxPower)
            {
                return Fail(UnitTextReason.BadPower, start, _at - start);
            }

            return new(Dimension.One, Scale.PowerOfTen(ten));
        }

        return Scale.OfDecimal(number) is { } scale
            ? new(Dimension.One, scale)
            : Fail(UnitTextReason.TooLarge, start, _at - start);
    }

    // The exponent behind a factor, one if there is none; null after a failure.
    private Rational? Exponent()
    {
        int start = _at;
        if (Peek == '^' || LooksAt("**"))
        {
            _at += Peek == '^' ? 1 : 2;
            bool parenthesis = Peek == '(';
            if (parenthesis)
                _at++;
            Rational? numerator = Integer();
            Rational denominator = 1;
            if (parenthesis && numerator is not null && Peek == '/')
            {
                _at++;
                denominator = Integer() ?? 0;
            }

            if (numerator is null || denominator.IsZero || (parenthesis && Peek != ')'))
            {
                Fail(UnitTextReason.BadPower, start, System.Math.Max(1, _at - start));
                return null;
            }

            if (parenthesis)
                _at++;
            return numerator.Value / denominator;
        }

        if (Superscript.ToPlain(Peek) is not null)
        {
            string raised = "";
            while (Superscript.ToPlain(Peek) is { } plain)
            {
                raised += plain;
                _at++;
            }

            return Parsed(raised, start);
        }

        // A figure behind a symbol is its power; behind a number or a parenthesis it has no meaning.
        bool afterSymbol = start > 0 && (char.IsLetter(_text[start - 1]) || _text[start - 1] is ']' or '_' or '°' or ')');
        if (afterSymbol && (IsDigit(_at) || (Peek is '-' or '+' or '−' && IsDigit(_at + 1))))
            return Integer();
        return Rational.One;
    }

    private Rational? Integer()
    {
        int start = _at;
        if (Peek is '-' or '+' or '−')
            _at++;
        TakeDigits();
        return Parsed(_text.Substring(start, _at - start).Replace('−', '-'), start);
    }

    private Rational? Parsed(string digits, int start)
    {
        if (int.TryParse(digits, NumberStyles.AllowLeadingSign, CultureInfo.InvariantCulture, out int value)
            && value is >= -MaxPower and <= MaxPower)
        {
            return value;
        }

        Fail(UnitTextReason.BadPower, start, System.Math.Max(1, _at - start));
        return null;
    }

    private void Raise(int firstSymbol, Rational exponent)
    {
        for (int i = firstSymbol; i < _symbols.Count; i++)
            _symbols[i] = new(_symbols[i].Key, _symbols[i].Value * exponent);
    }

    private Value? Checked(Dimension? dimension, Scale? scale)
        => dimension is null || scale is null ? Fail(UnitTextReason.TooLarge, 0, _end) : new(dimension, scale);

    private char Peek => _at < _end ? _text[_at] : '\0';

    private static bool StartsFactor(char c)
        => char.IsLetterOrDigit(c) || c is '(' or '[' or '{' or '√' or '°' or '\'' or '"' or '′' or '″' or '%' or '‰';

    private bool LooksAt(string word) => string.CompareOrdinal(_text, _at, word, 0, word.Length) == 0 && _at + word.Length <= _end;

    private bool IsDigit(int index) => index < _end && _text[index] is >= '0' and <= '9';

    private void TakeDigits()
    {
        while (IsDigit(_at))
            _at++;
    }

    private void SkipSpace()
    {
        while (_at < _end && char.IsWhiteSpace(_text[_at]))
            _at++;
    }

    private Value? Fail(UnitTextReason reason, int column, int length, string? nearest = null)
    {
        length = System.Math.Max(0, System.Math.Min(length, _text.Length - column));
        _error ??= new(reason, column, length, _text.Substring(column, length), nearest);
        return null;
    }
}
