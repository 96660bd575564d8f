using System;
using Microsoft.CodeAnalysis;

namespace FrameSafe.CodeFixes;

/// <summary>One change that mends a finding.</summary>
/// <param name="Title">What is offered, in words; it says what becomes of the numbers.</param>
/// <param name="Key">What distinguishes it from other choices at the same finding: the same choice everywhere is one Fix All.</param>
/// <param name="Target">The node that is replaced.</param>
/// <param name="Change">What it becomes, given what it is by then: an outer change sees the inner ones done.</param>
internal sealed record Mending(string Title, string Key, SyntaxNode Target, Func<SyntaxNode, SyntaxNode> Change);
