using System;
using System.IO;
using System.Linq;
using System.Reflection;
using Xunit;

namespace Convection.Correlations.Tests.Docs;

/// <summary>The README's example is the one that is compiled, and its output the one that is printed.</summary>
public class ReadmeTests
{
    private static readonly string Readme = Text("README.md");

    [Fact]
    public void Example_InTheReadme_IsTheCompiledOne()
        => Assert.Contains("```csharp\n" + Text("docs/example/Program.cs") + "```\n", Readme, StringComparison.Ordinal);

    [Fact]
    public void Output_InTheReadme_IsWhatTheExamplePrints()
    {
        TextWriter console = Console.Out;
        using var printed = new StringWriter();
        Console.SetOut(printed);
        try
        {
            Assembly.Load("example").EntryPoint!.Invoke(null, [Array.Empty<string>()]);
        }
        finally
        {
            Console.SetOut(console);
        }

        string output = string.Join("\n", printed.ToString().ReplaceLineEndings("\n").TrimEnd('\n').Split('\n').Select(l => l.TrimEnd()));
        Assert.Contains("```text\n" + output + "\n```\n", Readme, StringComparison.Ordinal);
    }

    private static string Text(string path) => File.ReadAllText(QuickstartTests.Repository(path)).ReplaceLineEndings("\n");
}
