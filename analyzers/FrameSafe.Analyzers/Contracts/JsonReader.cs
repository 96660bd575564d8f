using System.Collections.Generic;
using System.Globalization;
using System.Text;
using Microsoft.CodeAnalysis.Text;

namespace FrameSafe.Analyzers.Contracts;

/// <summary>Reads JSON (RFC 8259). The analyzer may bring no library along, so it reads what contract files need by itself.</summary>
internal sealed class JsonReader
{
    private const int MaxDepth = 32;

    private readonly string _text;
    private int _at;
    private JsonProblem? _problem;

    private JsonReader(string text) => _text = text;

    internal static JsonValue? Read(string text, out JsonProblem? problem)
    {
        var reader = new JsonReader(text);
        JsonValue? value = reader.Value(0);
        reader.Space();
        if (value is not null && reader._problem is null && reader._at < text.Length)
            reader.Fail("nothing more is expected here");
        problem = reader._problem;
        return problem is null ? value : null;
    }

    private JsonValue? Value(int depth)
    {
        Space();
        int start = _at;
        if (depth > MaxDepth)
            return Fail("it is nested too deeply");
        if (_at >= _text.Length)
            return Fail("a value is missing");
        switch (_text[_at])
        {
            case '{':
                return Object(depth);
            case '[':
                return Array(depth);
            case '"':
                return String() is { } text ? new(TextSpan.FromBounds(start, _at), text, null) : null;
            default:
                return Word(start);
        }
    }

    private JsonValue? Object(int depth)
    {
        int start = _at++;
        var members = new List<JsonMember>();
        for (Space(); !Take('}'); Space())
        {
            if (members.Count > 0 && !Take(','))
                return Fail("a comma or } is expected");
            Space();
            int name = _at;
            if (String() is not { } key)
                return null;
            TextSpan span = TextSpan.FromBounds(name, _at);
            Space();
            if (!Take(':'))
                return Fail("a colon is expected");
            if (Value(depth + 1) is not { } value)
                return null;
            members.Add(new(key, span, value));
        }

        return new(TextSpan.FromBounds(start, _at), null, members);
    }

    // Arrays have no part in a contract; they are read over.
    private JsonValue? Array(int depth)
    {
        int start = _at++;
        bool first = true;
        for (Space(); !Take(']'); Space())
        {
            if (!first && !Take(','))
                return Fail("a comma or ] is expected");
            first = false;
            if (Value(depth + 1) is null)
                return null;
        }

        return new(TextSpan.FromBounds(start, _at), null, null);
    }

    private JsonValue? Word(int start)
    {
        while (_at < _text.Length && (char.IsLetterOrDigit(_text[_at]) || _text[_at] is '+' or '-' or '.'))
            _at++;
        string word = _text.Substring(start, _at - start);
        TextSpan span = TextSpan.FromBounds(start, _at);
        if (word is "true" or "false")
            return new(span, word == "true", null);
        if (word == "null")
            return new(span, null, null);
        if (double.TryParse(word, NumberStyles.Float, CultureInfo.InvariantCulture, out double number))
            return new(span, number, null);
        _at = start;
        return Fail("a value is expected");
    }

    private string? String()
    {
        if (!Take('"'))
        {
            Fail("a text in quotes is expected");
            return null;
        }

        var text = new StringBuilder();
        while (_at < _text.Length && _text[_at] is not ('"' or '\n'))
        {
            char character = _text[_at++];
            if (character != '\\' || _at >= _text.Length)
            {
                text.Append(character);
                continue;
            }

            char escape = _text[_at++];
            if (escape == 'u' && _at + 4 <= _text.Length
                && int.TryParse(_text.Substring(_at, 4), NumberStyles.HexNumber, CultureInfo.InvariantCulture, out int code))
            {
                text.Append((char)code);
                _at += 4;
            }
            else
            {
                text.Append(escape switch { 'n' => '\n', 't' => '\t', 'r' => '\r', 'b' => '\b', 'f' => '\f', _ => escape });
            }
        }

        if (Take('"'))
            return text.ToString();
        Fail("the closing quote is missing");
        return null;
    }

    private bool Take(char character)
    {
        if (_at >= _text.Length || _text[_at] != character)
            return false;
        _at++;
        return true;
    }

    private void Space()
    {
        while (_at < _text.Length && char.IsWhiteSpace(_text[_at]))
            _at++;
    }

    private JsonValue? Fail(string message)
    {
        _problem ??= new(new TextSpan(System.Math.Min(_at, _text.Length), 0), message);
        // Whoever loops for a closing bracket must come to an end.
        _at = _text.Length;
        return null;
    }
}
