using FrameSafe.Accuracy;

namespace FrameSafe.Tests;

/// <summary>Every quantity of the reference files within 4 ulp, or 4 + 2·cond where the case says how ill-conditioned it is.</summary>
public sealed class AccuracyTests
{
    private static readonly Lazy<IReadOnlyList<Row>> Rows = new(() => Measurer.Measure(Path.Combine(AppContext.BaseDirectory, "Checks")).Rows);

    public static TheoryData<string> Files
        => [.. Directory.GetFiles(Path.Combine(AppContext.BaseDirectory, "Checks"), "*.json").Select(path => Path.GetFileNameWithoutExtension(path)!).Where(name => name != "published")];

    [Theory]
    [MemberData(nameof(Files))]
    public void All_quantities_of_a_file_are_within_what_is_allowed(string file)
    {
        Row[] rows = [.. Rows.Value.Where(row => row.File == file)];

        Assert.NotEmpty(rows);
        Assert.All(rows, row => Assert.True(row.IsWithin, row.ToString()));
    }
}
