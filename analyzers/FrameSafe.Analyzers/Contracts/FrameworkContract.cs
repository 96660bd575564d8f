namespace FrameSafe.Analyzers.Contracts;

/// <summary>The ready contract for what the framework says about time.</summary>
internal static class FrameworkContract
{
    internal const string Text = """
        {
          "version": 1,
          "members": {
            "P:System.TimeSpan.TotalDays": { "unit": "d" },
            "P:System.TimeSpan.TotalHours": { "unit": "h" },
            "P:System.TimeSpan.TotalMinutes": { "unit": "min" },
            "P:System.TimeSpan.TotalSeconds": { "unit": "s" },
            "P:System.TimeSpan.TotalMilliseconds": { "unit": "ms" },
            "P:System.TimeSpan.TotalMicroseconds": { "unit": "us" },
            "P:System.TimeSpan.TotalNanoseconds": { "unit": "ns" },
            "M:System.TimeSpan.FromDays(System.Double)": { "parameters": { "value": { "unit": "d" } } },
            "M:System.TimeSpan.FromHours(System.Double)": { "parameters": { "value": { "unit": "h" } } },
            "M:System.TimeSpan.FromMinutes(System.Double)": { "parameters": { "value": { "unit": "min" } } },
            "M:System.TimeSpan.FromSeconds(System.Double)": { "parameters": { "value": { "unit": "s" } } },
            "M:System.TimeSpan.FromMilliseconds(System.Double)": { "parameters": { "value": { "unit": "ms" } } },
            "M:System.TimeSpan.FromMicroseconds(System.Double)": { "parameters": { "value": { "unit": "us" } } },
            "M:System.DateTime.AddDays(System.Double)": { "parameters": { "value": { "unit": "d" } } },
            "M:System.DateTime.AddHours(System.Double)": { "parameters": { "value": { "unit": "h" } } },
            "M:System.DateTime.AddMinutes(System.Double)": { "parameters": { "value": { "unit": "min" } } },
            "M:System.DateTime.AddSeconds(System.Double)": { "parameters": { "value": { "unit": "s" } } },
            "M:System.DateTime.AddMilliseconds(System.Double)": { "parameters": { "value": { "unit": "ms" } } },
            "P:System.Diagnostics.Stopwatch.ElapsedMilliseconds": { "unit": "ms" },
            "M:System.Threading.Thread.Sleep(System.Int32)": { "parameters": { "millisecondsTimeout": { "unit": "ms" } } },
            "M:System.Threading.Tasks.Task.Delay(System.Int32)": { "parameters": { "millisecondsDelay": { "unit": "ms" } } }
          }
        }
        """;
}
