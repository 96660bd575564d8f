using System;
using System.Collections.Generic;
using System.Collections.Immutable;
using System.Linq;
using System.Threading;
using FrameSafe.Analyzers.Reading;
using Microsoft.CodeAnalysis;
using Microsoft.CodeAnalysis.Text;

namespace FrameSafe.Analyzers.Contracts;

/// <summary>What all contracts of a compilation say: the framework's, and the files of the project.</summary>
internal sealed class ContractTable
{
    private readonly Dictionary<ISymbol, Declaration> _declarations = new(SymbolEqualityComparer.Default);
    private readonly Dictionary<ISymbol, Declaration> _returns = new(SymbolEqualityComparer.Default);
    private readonly List<(AdditionalText File, SourceText Text, JsonProblem Problem)> _problems = [];

    private ContractTable()
    {
    }

    /// <summary>What cannot be read, file by file.</summary>
    internal IEnumerable<(Location Place, string Message)> Problems => _problems.Select(problem => (
        Location.Create(problem.File.Path, problem.Problem.Span, problem.Text.Lines.GetLinePositionSpan(problem.Problem.Span)),
        problem.Problem.Message));

    internal static ContractTable Read(Compilation compilation, ImmutableArray<AdditionalText> files, CancellationToken cancellation)
    {
        var table = new ContractTable();
        // What a framework of another age lacks of it is no mistake.
        Contract.Read(FrameworkContract.Text, compilation, table._declarations, table._returns);
        foreach (AdditionalText file in files.Where(file => file.Path.EndsWith(Contract.FileSuffix, StringComparison.OrdinalIgnoreCase)).OrderBy(file => file.Path, StringComparer.Ordinal))
        {
            if (file.GetText(cancellation) is not { } text)
                continue;
            foreach (JsonProblem problem in Contract.Read(text.ToString(), compilation, table._declarations, table._returns))
                table._problems.Add((file, text, problem));
        }

        return table;
    }

    internal Declaration? Of(ISymbol symbol)
        => _declarations.TryGetValue(symbol.OriginalDefinition, out Declaration? declaration) ? declaration : null;

    internal Declaration? OfReturn(IMethodSymbol method)
        => _returns.TryGetValue(method.OriginalDefinition, out Declaration? declaration) ? declaration : null;
}
