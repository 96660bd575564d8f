using System.Diagnostics;
using System.Text.Json;
using System.Text.Json.Nodes;
using StreamJsonRpc;

namespace FrameSafe.EndToEnd;

/// <summary>A C# language server over standard input and output, spoken to as an editor does.</summary>
internal sealed class LanguageServer : IAsyncDisposable
{
    private readonly Process _process;
    private readonly JsonRpc _rpc;
    private int _version;

    private LanguageServer(Process process, JsonRpc rpc)
    {
        _process = process;
        _rpc = rpc;
    }

    public static async Task<LanguageServer> StartAsync(PackedFeed feed, FreshProject project)
    {
        Directory.CreateDirectory(Path.Combine(project.Folder, ".config"));
        File.Copy(Path.Combine(feed.Repository, ".config", "dotnet-tools.json"), Path.Combine(project.Folder, ".config", "dotnet-tools.json"));
        project.Dotnet("tool", "restore", "--add-source", feed.Folder).MustSucceed();
        project.Dotnet("restore").MustSucceed();

        var start = new ProcessStartInfo("dotnet", ["tool", "run", "csharp-ls"])
        {
            WorkingDirectory = project.Folder,
            RedirectStandardInput = true,
            RedirectStandardOutput = true,
            RedirectStandardError = true,
        };
        Process process = Process.Start(start) ?? throw new InvalidOperationException("The language server did not start.");
        process.ErrorDataReceived += static (_, _) => { };
        process.BeginErrorReadLine();

        var rpc = new JsonRpc(new HeaderDelimitedMessageHandler(
            process.StandardInput.BaseStream, process.StandardOutput.BaseStream, new SystemTextJsonFormatter()));
        rpc.AddLocalRpcTarget(new Editor());
        rpc.StartListening();

        var server = new LanguageServer(process, rpc);
        await rpc.InvokeWithParameterObjectAsync<JsonElement>("initialize", new
        {
            processId = Environment.ProcessId,
            rootUri = new Uri(project.Folder).AbsoluteUri,
            workspaceFolders = new[] { new { uri = new Uri(project.Folder).AbsoluteUri, name = "fresh" } },
            capabilities = new
            {
                workspace = new { configuration = true },
                window = new { workDoneProgress = true },
                textDocument = new { diagnostic = new { dynamicRegistration = true } },
            },
        });
        await rpc.NotifyWithParameterObjectAsync("initialized", new { });
        return server;
    }

    public Task OpenAsync(string path)
        => _rpc.NotifyWithParameterObjectAsync("textDocument/didOpen", new
        {
            textDocument = new { uri = new Uri(path).AbsoluteUri, languageId = "csharp", version = ++_version, text = File.ReadAllText(path) },
        });

    public Task ChangeAsync(string path, string text)
        => _rpc.NotifyWithParameterObjectAsync("textDocument/didChange", new
        {
            textDocument = new { uri = new Uri(path).AbsoluteUri, version = ++_version },
            contentChanges = new[] { new { text } },
        });

    /// <summary>The codes of the diagnostics that the server reports for a file as it stands now.</summary>
    public async Task<IReadOnlyList<string>> CodesAsync(string path)
    {
        JsonElement report = await _rpc.InvokeWithParameterObjectAsync<JsonElement>(
            "textDocument/diagnostic", new { textDocument = new { uri = new Uri(path).AbsoluteUri } });
        return [.. report.GetProperty("items").EnumerateArray().Select(item => item.GetProperty("code").ToString())];
    }

    /// <summary>Asks until the codes are as wanted; a server may need a moment after an edit.</summary>
    public async Task<IReadOnlyList<string>> CodesAsync(string path, Func<IReadOnlyList<string>, bool> wanted)
    {
        var patience = Stopwatch.StartNew();
        while (true)
        {
            IReadOnlyList<string> codes = await CodesAsync(path);
            if (wanted(codes) || patience.Elapsed > TimeSpan.FromSeconds(90))
                return codes;
            await Task.Delay(TimeSpan.FromMilliseconds(200));
        }
    }

    public async ValueTask DisposeAsync()
    {
        _rpc.Dispose();
        if (!_process.HasExited)
            _process.Kill(entireProcessTree: true);
        await _process.WaitForExitAsync();
        _process.Dispose();
    }

    /// <summary>The editor's side: what the server asks of it.</summary>
    private sealed class Editor
    {
        [JsonRpcMethod("workspace/configuration", UseSingleObjectParameterDeserialization = true)]
        public JsonArray Configuration(JsonElement request)
            => new([.. request.GetProperty("items").EnumerateArray().Select(_ => (JsonNode)new JsonObject { ["analyzersEnabled"] = true })]);

        [JsonRpcMethod("client/registerCapability", UseSingleObjectParameterDeserialization = true)]
        public JsonNode? Register(JsonElement request) => null;

        [JsonRpcMethod("window/workDoneProgress/create", UseSingleObjectParameterDeserialization = true)]
        public JsonNode? CreateProgress(JsonElement request) => null;
    }
}
