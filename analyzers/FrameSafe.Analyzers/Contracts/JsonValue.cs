using System.Collections.Generic;
using Microsoft.CodeAnalysis.Text;

namespace FrameSafe.Analyzers.Contracts;

/// <summary>A value of a JSON text (RFC 8259), with where it stands.</summary>
/// <param name="Span">Where it stands.</param>
/// <param name="Scalar">A string, number (as double), true, false or null; null for an object or an array.</param>
/// <param name="Members">The members of an object, in their order; null for any other.</param>
internal sealed record JsonValue(TextSpan Span, object? Scalar, IReadOnlyList<JsonMember>? Members)
{
    internal string? Text => Scalar as string;
}

/// <summary>A member of an object.</summary>
internal sealed record JsonMember(string Name, TextSpan Span, JsonValue Value);

/// <summary>What is wrong with a text, and where.</summary>
internal sealed record JsonProblem(TextSpan Span, string Message);
