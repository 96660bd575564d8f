using System.Collections.Generic;
using System.Linq;
using System.Runtime.CompilerServices;
using System.Threading;
using FrameSafe.Analyzers.Reading;
using FrameSafe.Analyzers.Tags;
using Microsoft.CodeAnalysis;
using Microsoft.CodeAnalysis.CSharp.Syntax;
using Microsoft.CodeAnalysis.Operations;

namespace FrameSafe.Analyzers.Flow;

/// <summary>
/// One walk of one body, tags as abstract values: statements in their order, joins where paths meet, loops to a fixed point.
/// It judges nothing; what does not go together is noted as an <see cref="Encounter"/>.
/// </summary>
internal sealed partial class Walk : OperationVisitor<object?, Value>
{
    private readonly Knowledge _knowledge;
    private readonly CancellationToken _cancellation;
    private readonly Environment _environment = new();
    private readonly List<Encounter> _encounters = [];
    private readonly List<Observation> _others = [];
    private readonly Stack<Jumps> _jumps = new();
    private readonly int _depth;
    private readonly bool _isBoundary;
    private Returns _returns;
    private Assignments? _assignments;

    internal Walk(Knowledge knowledge, ISymbol member, CancellationToken cancellation, int depth = 0)
    {
        _knowledge = knowledge;
        _cancellation = cancellation;
        _depth = depth;
        _returns = Returns.Of(member, knowledge.Tags);
        _isBoundary = knowledge.Tags.IsBoundary(member);
    }

    /// <summary>What the walk noted, in the order of the code.</summary>
    internal IEnumerable<Observation> Observations => ((IEnumerable<Observation>)_encounters).Concat(_others)
        .OrderBy(static observation => observation.Place.SpanStart);

    /// <summary>What the body returns, over all its returns.</summary>
    internal Value Result => _returns.Result ?? Value.Unknown;

    /// <summary>Walks a body; an expression that is a body by itself (an initialiser) is a value that goes to its member.</summary>
    internal void Run(IOperation body)
    {
        _assignments = new(body);
        Visit(body);
    }

    /// <summary>Says what a parameter holds where the body is walked for one call.</summary>
    internal void Bind(IParameterSymbol parameter, Value value) => _environment.Set(parameter, value);

    public override Value Visit(IOperation? operation, object? argument = null)
    {
        if (operation is null)
            return Value.Unknown;
        _cancellation.ThrowIfCancellationRequested();
        RuntimeHelpers.EnsureSufficientExecutionStack();
        // What the compiler has no kind for, its visitor passes over.
        return (operation.Kind == OperationKind.None ? DefaultVisit(operation, argument) : operation.Accept(this, argument)) ?? Value.Unknown;
    }

    public override Value DefaultVisit(IOperation operation, object? argument)
    {
        // The one array creation that the compiler's operations have no kind for; its element is what is put in.
        if (operation.Kind == OperationKind.None && operation.Syntax is StackAllocArrayCreationExpressionSyntax or ImplicitStackAllocArrayCreationExpressionSyntax)
            return StackAllocated(operation);
        foreach (IOperation child in operation.ChildOperations)
            Visit(child);
        return Value.Unknown;
    }

    private Value StackAllocated(IOperation operation)
    {
        Value elements = Value.Of(Tag.Neutral);
        foreach (IOperation child in operation.ChildOperations)
        {
            Value value = Visit(child);
            if (child.Type?.SpecialType is not (SpecialType.System_Int32 or SpecialType.System_Int64))
                elements = Value.Merge(elements, value);
        }

        return elements;
    }

    private bool IsUnstable(ISymbol variable) => _assignments?.IsUnstable(variable) == true;

    private SymbolTags Tags => _knowledge.Tags;

    private (int Encounters, int Others) Noted => (_encounters.Count, _others.Count);

    // What was noted since will be noted again, or is noted elsewhere.
    private void Forget((int Encounters, int Others) noted)
    {
        _encounters.RemoveRange(noted.Encounters, _encounters.Count - noted.Encounters);
        _others.RemoveRange(noted.Others, _others.Count - noted.Others);
    }

    private void Note(SyntaxNode place, Clash? clash, Side left, Side right, string verb)
    {
        if (clash is { Kind: ClashKind.Dimension } && (IsBareLight(left.Value) || IsBareLight(right.Value)))
            return;
        if (clash is not null && _environment.IsReachable && !(_isBoundary && IsCrossing(clash.Kind)))
            _encounters.Add(new(place, clash, left, right, verb));
    }

    // What a member that is itself a crossing is there to do.
    private static bool IsCrossing(ClashKind kind) => kind is ClashKind.Frame or ClashKind.VelocityFrames or ClashKind.Simultaneity
        or ClashKind.ProperAndCoordinateTime or ClashKind.Clock or ClashKind.TimeScale or ClashKind.FramePair or ClashKind.Passage;

    /// <summary>What leaves a loop or switch early: the states at its breaks and continues.</summary>
    private sealed class Jumps(ILabelSymbol? exit, ILabelSymbol? next, int mark)
    {
        internal ILabelSymbol? Exit { get; } = exit;

        internal ILabelSymbol? Next { get; } = next;

        internal int Mark { get; } = mark;

        internal List<Changes> Breaks { get; } = [];

        internal List<Changes> Continues { get; } = [];
    }

    /// <summary>What the function being walked is declared to return, and what it does return.</summary>
    private sealed class Returns(Declaration? target, string description)
    {
        internal Declaration? Target { get; } = target;

        internal string Description { get; } = description;

        internal Value? Result { get; private set; }

        internal static Returns Of(ISymbol? member, SymbolTags tags) => member switch
        {
            IMethodSymbol { AssociatedSymbol: IPropertySymbol property } => new(tags.Of(property), "property `" + property.Name + "`"),
            IMethodSymbol method => new(tags.OfReturn(method), "the result of `" + method.Name + "`"),
            IPropertySymbol property => new(tags.Of(property), "property `" + property.Name + "`"),
            IFieldSymbol field => new(tags.Of(field), "field `" + field.Name + "`"),
            _ => new(null, ""),
        };

        internal void Add(Value value) => Result = Result is null ? value : Value.Merge(Result, value);
    }
}
