using System;
using System.IO;
using System.Linq;
using System.Reflection;
using System.Runtime.CompilerServices;
using System.Text;
using System.Threading.Tasks;
using Xunit.Sdk;

namespace Convection.Correlations.Tests;

/// <summary>Guards a text against unwanted change: compares it with a committed <c>Class.Method_name.verified.txt</c>.</summary>
/// <remarks>
/// File convention and call are those of Verify.Xunit, which could take this class's place. A missing or different file fails
/// and leaves a <c>.received.txt</c>; UPDATE_SNAPSHOTS=1 accepts what is received, except on a build server.
/// </remarks>
internal static class Snapshot
{
    public static Task Verify(string text, string name = "", [CallerFilePath] string file = "", [CallerMemberName] string member = "")
    {
        string id = Path.GetFileNameWithoutExtension(file) + "." + member + (name.Length == 0 ? string.Empty : "_" + name);
        string verified = Path.Combine(Metadata("SnapshotFolder"), id + ".verified.txt");
        string received = Path.Combine(Metadata("SnapshotFolder"), id + "." + Metadata("SnapshotTarget") + ".received.txt");
        string actual = Normalise(text);
        if (File.Exists(verified) && Normalise(File.ReadAllText(verified)) == actual)
        {
            File.Delete(received);
            return Task.CompletedTask;
        }

        bool accept = Environment.GetEnvironmentVariable("UPDATE_SNAPSHOTS") == "1" && Environment.GetEnvironmentVariable("CI") != "true";
        File.WriteAllText(accept ? verified : received, actual, new UTF8Encoding(encoderShouldEmitUTF8Identifier: false));
        return accept
            ? Task.CompletedTask
            : throw new XunitException("Snapshot missing or different: " + verified + "\nReceived: " + received + "\nUPDATE_SNAPSHOTS=1 accepts it.");
    }

    private static string Normalise(string text) => text.Replace("\r\n", "\n", StringComparison.Ordinal).TrimEnd('\n') + "\n";

    private static string Metadata(string key)
        => typeof(Snapshot).Assembly.GetCustomAttributes<AssemblyMetadataAttribute>().Single(a => a.Key == key).Value!;
}
