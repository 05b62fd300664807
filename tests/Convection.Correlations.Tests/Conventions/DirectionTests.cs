using System;
using System.Linq;
using Convection.Correlations.Rooms;
using NetArchTest.Rules;
using Xunit;

namespace Convection.Correlations.Tests.Conventions;

/// <summary>Folders depend on lower folders only.</summary>
public class DirectionTests
{
    private const string Root = "Convection.Correlations.";

    // Lowest first.
    private static readonly string[] Folders = ["Air", "Surfaces", "Flows", "Rooms", "Laws", "Registry", "Literature", "Jets", "Selection", "Evaluation"];

    public static TheoryData<string, string[]> Rules()
    {
        var rules = new TheoryData<string, string[]>();
        for (int i = 0; i < Folders.Length - 1; i++)
        {
            rules.Add(Folders[i], [.. Folders.Skip(i + 1).Select(f => Root + f)]);
        }

        return rules;
    }

    [Theory]
    [MemberData(nameof(Rules))]
    public void Folder_DependsOn_LowerFoldersOnly(string folder, string[] higher)
    {
        TestResult result = Types.InAssembly(typeof(RoomContext).Assembly)
            .That().ResideInNamespace(Root + folder)
            .Should().NotHaveDependencyOnAny(higher)
            .GetResult();
        Assert.True(result.IsSuccessful, string.Join(", ", result.FailingTypes?.Select(t => t.FullName) ?? []));
    }

    [Fact]
    public void EveryNamespace_IsAFolderOfTheList()
    {
        string[] namespaces = [.. typeof(RoomContext).Assembly.GetExportedTypes().Select(t => t.Namespace!).Distinct()];
        Assert.All(namespaces, n => Assert.Contains(n, Folders.Select(f => Root + f)));
        Assert.Equal(Folders.Length, namespaces.Length);
    }

    /// <summary>The rule can fail: evaluation does depend on selection.</summary>
    [Fact]
    public void Rule_WhereItIsBroken_Fails()
        => Assert.False(Types.InAssembly(typeof(RoomContext).Assembly)
            .That().ResideInNamespace(Root + "Evaluation")
            .Should().NotHaveDependencyOnAny(Root + "Selection")
            .GetResult().IsSuccessful);
}
