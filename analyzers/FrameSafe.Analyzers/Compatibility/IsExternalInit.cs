namespace System.Runtime.CompilerServices;

/// <summary>What the compiler asks for to compile <c>init</c> and records; netstandard2.0 lacks it.</summary>
internal static class IsExternalInit;
