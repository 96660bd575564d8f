namespace System.Diagnostics.CodeAnalysis;

/// <summary>Tells the compiler that an out parameter is not null for one return value; netstandard2.0 lacks it.</summary>
[AttributeUsage(AttributeTargets.Parameter)]
internal sealed class NotNullWhenAttribute(bool returnValue) : Attribute
{
    public bool ReturnValue { get; } = returnValue;
}
