namespace FrameSafe.Tool;

/// <summary>What was asked for cannot be done; the message is one line that names the thing, the place and what is allowed.</summary>
internal sealed class BadInputException(string message) : Exception(message);
