using System.Globalization;
using FrameSafe.Accuracy;

if (args.Length != 1 || !Directory.Exists(args[0]))
{
    Console.Error.WriteLine("A folder of reference files (*.json) is wanted: dotnet run -c Release --project tests/FrameSafe.Accuracy -- FOLDER");
    return 2;
}

(IReadOnlyList<Row> rows, IReadOnlyList<string> uncovered) = Measurer.Measure(args[0]);
// Of each quantity the case that comes nearest to what is allowed for it, or is beyond it the most.
Console.WriteLine($"{"file",-32} {"quantity",-28} {"cases",5} {"error/ulp",10} {"allowed",10}  in the case nearest its bound");
foreach (Row row in rows)
{
    Console.WriteLine(string.Create(
        CultureInfo.InvariantCulture,
        $"{row.File,-32} {row.Quantity,-28} {row.Cases,5} {row.WorstUlp,10:G3} {row.Allowed,10:G3}  {row.WorstCase}{(row.IsWithin ? "" : "  BEYOND")}"));
}

foreach (string missing in uncovered)
    Console.WriteLine("not covered: " + missing);
int beyond = rows.Count(row => !row.IsWithin);
Console.WriteLine($"{rows.Count} quantities of {rows.Sum(row => row.Cases)} values, {beyond} beyond what is allowed.");
return beyond == 0 ? 0 : 1;
