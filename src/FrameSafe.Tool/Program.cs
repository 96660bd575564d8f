using FrameSafe.Tool.Commands;

return await ToolCommand.Create().Parse(args).InvokeAsync();
