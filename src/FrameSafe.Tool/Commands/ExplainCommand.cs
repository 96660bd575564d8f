using System.CommandLine;
using System.Reflection;

namespace FrameSafe.Tool.Commands;

/// <summary><c>framesafe explain</c>: prints the page of a rule.</summary>
internal static class ExplainCommand
{
    internal static Command Create()
    {
        var rule = new Argument<string>("rule") { Description = "The id of a rule, such as FRAME301." };
        var command = new Command(
            "explain",
            """
            Print the page of a rule: what it reports, why it matters, what stays silent.

            Example:
              framesafe explain FRAME301
            """)
        { rule };
        command.SetAction((parsed, cancellation) => Running.RunAsync(async () =>
        {
            await Console.Out.WriteAsync(await PageAsync(parsed.GetValue(rule)!.ToUpperInvariant(), cancellation));
            return ExitCode.Clean;
        }));
        return command;
    }

    private static async Task<string> PageAsync(string rule, CancellationToken cancellation)
    {
        Assembly assembly = typeof(ExplainCommand).Assembly;
        await using Stream? page = assembly.GetManifestResourceStream(rule + ".md");
        if (page is null)
        {
            string[] known = [.. assembly.GetManifestResourceNames().Where(name => name.EndsWith(".md", StringComparison.Ordinal)).Select(name => name[..^3]).Order(StringComparer.Ordinal)];
            throw new BadInputException($"{rule}: there is no such rule; the rules are {string.Join(", ", known)}.");
        }

        using var reader = new StreamReader(page);
        return await reader.ReadToEndAsync(cancellation);
    }
}
