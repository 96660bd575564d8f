namespace FrameSafe.Accuracy;

/// <summary>What the library gives for the quantities of one case, by the names that the file uses; vectors by their components.</summary>
internal sealed class Quantities
{
    private readonly Dictionary<string, Func<double[]>> _values = [];
    private readonly Dictionary<string, Func<string>> _words = [];

    internal IReadOnlyDictionary<string, Func<double[]>> Values => _values;

    internal IReadOnlyDictionary<string, Func<string>> Words => _words;

    internal Quantities Add(string name, Func<double> value)
    {
        _values.Add(name, () => [value()]);
        return this;
    }

    internal Quantities Add(string name, Func<double[]> value)
    {
        _values.Add(name, value);
        return this;
    }

    internal Quantities AddWord(string name, Func<string> word)
    {
        _words.Add(name, word);
        return this;
    }
}
