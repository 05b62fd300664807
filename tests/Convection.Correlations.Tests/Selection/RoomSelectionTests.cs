using System;
using System.Linq;
using System.Threading.Tasks;
using Convection.Correlations.Evaluation;
using Convection.Correlations.Flows;
using Convection.Correlations.Literature;
using Convection.Correlations.Registry;
using Convection.Correlations.Rooms;
using Convection.Correlations.Selection;
using Convection.Correlations.Surfaces;
using Xunit;

namespace Convection.Correlations.Tests.Selection;

public class RoomSelectionTests
{
    public static TheoryData<int> Rooms() => [.. Enumerable.Range(0, TestRooms.All.Count)];

    /// <summary>The whole explanation of every room, in every culture.</summary>
    [Theory]
    [MemberData(nameof(Rooms))]
    public Task Explanation_OfARoom_IsStable(int index)
        => Snapshot.Verify(EveryCulture.Of(() => RoomConvection.Bind(TestRooms.All[index]).Explain()), TestRooms.All[index].Name);

    [Theory]
    [MemberData(nameof(Rooms))]
    public void EverySurface_HasReasonsOnBothSides_AndAPartOrAGapForEveryDeviceItFeels(int index)
    {
        RoomSelection selection = RoomSelection.Choose(TestRooms.All[index]);
        foreach (SurfaceSelection surface in selection.Surfaces)
        {
            Assert.True(Covers(surface, PartKind.StillAir, null), surface.Surface.Name);
            Assert.All(surface.Parts.SelectMany(p => p.Chosen), c => Assert.NotEmpty(c.Reasons));
            foreach (FlowDescriptor device in selection.Room.Devices)
            {
                bool feels = device.Driver != FlowDriver.AirStream || device.PlacementOf(surface.Surface.Name) == Placement.InStream;
                bool covered = Covers(surface, PartKind.Heater, device) || Covers(surface, PartKind.Forced, device);
                bool gap = surface.Gaps.Any(g => g.Device == device);
                Assert.Equal(feels, covered || gap);
                Assert.False(covered && gap, "a part that covers both sides leaves no gap");
            }
        }
    }

    // Common practice, no source, and section "defaults" of the docs: what each kind of surface gets in still air.
    [Theory]
    [InlineData(SurfaceKind.Wall, SurfaceRole.Passive, "alamdari-hammond-1983/vertical", "alamdari-hammond-1983/vertical")]
    [InlineData(SurfaceKind.Window, SurfaceRole.Passive, "iso-15099-2003/window-tilt-15-90", "iso-15099-2003/window-tilt-15-90")]
    [InlineData(SurfaceKind.Floor, SurfaceRole.Passive, "alamdari-hammond-1983/horizontal-unstable", "alamdari-hammond-1983/horizontal-stable")]
    [InlineData(SurfaceKind.Ceiling, SurfaceRole.Passive, "alamdari-hammond-1983/horizontal-stable", "alamdari-hammond-1983/horizontal-unstable")]
    [InlineData(SurfaceKind.Floor, SurfaceRole.Heated, "awbi-hatton-1999/floor-heated", "alamdari-hammond-1983/horizontal-stable")]
    [InlineData(SurfaceKind.Wall, SurfaceRole.Heated, "awbi-hatton-1999/wall-heated", "alamdari-hammond-1983/vertical")]
    [InlineData(SurfaceKind.Ceiling, SurfaceRole.Heated, "min-1956/ceiling-heated", "alamdari-hammond-1983/horizontal-unstable")]
    [InlineData(SurfaceKind.Ceiling, SurfaceRole.Chilled, "alamdari-hammond-1983/horizontal-stable", "min-1956/floor-heated-or-ceiling-cooled")]
    [InlineData(SurfaceKind.Floor, SurfaceRole.Chilled, "alamdari-hammond-1983/horizontal-unstable", "ashrae-2012/panel-floor-cooled")]
    [InlineData(SurfaceKind.Wall, SurfaceRole.Chilled, "alamdari-hammond-1983/vertical", "min-1956/wall")]
    public void StillAir_KindAndRole_GetsTheExpectedLaw(SurfaceKind kind, SurfaceRole role, string warmer, string cooler)
    {
        SurfaceSelection selection = Alone(new SurfaceContext("it", kind, 4, 3) { Role = role });
        Assert.Equal(warmer, Chosen(selection, SurfaceSide.Warmer));
        Assert.Equal(cooler, Chosen(selection, SurfaceSide.Cooler));
    }

    [Fact]
    public void ChilledFloor_NoExactLaw_IsAStatedGap()
    {
        var policy = new ConvectionPolicy
        {
            Exclude = [.. PublishedLiterature.Registry.Query(new() { Driver = FlowDriver.Panel, Surfaces = SurfaceSet.Floor }).Select(c => c.Id)],
        };
        SelectionGap gap = Assert.Single(Alone(new SurfaceContext("it", SurfaceKind.Floor, 4, 3) { Role = SurfaceRole.Chilled }, policy).Gaps);
        Assert.Equal(SurfaceSide.Cooler, gap.Side);
        Assert.Contains("chilled floor cooler than the air", gap.Text, StringComparison.Ordinal);
    }

    [Fact]
    public void WarmCeilingAndCoolFloor_AreDifferentCasesFromTheirOpposites()
    {
        SurfaceSelection ceiling = Alone(new SurfaceContext("ceiling", SurfaceKind.Ceiling, 4, 4));
        Assert.NotEqual(Chosen(ceiling, SurfaceSide.Warmer), Chosen(ceiling, SurfaceSide.Cooler));
    }

    [Fact]
    public void Radiator_PlaceOfASurface_DecidesTheLaw()
    {
        var radiator = new Radiator("radiator")
        {
            Placements = [new SurfacePlacement("window", Placement.Above), new SurfacePlacement("breast", Placement.Beside)],
        };
        RoomSelection selection = RoomSelection.Choose(new RoomContext(
            "r",
            40,
            [
                new SurfaceContext("window", SurfaceKind.Window, 2, 1.5),
                new SurfaceContext("far window", SurfaceKind.Window, 2, 1.5),
                new SurfaceContext("breast", SurfaceKind.Wall, 2, 1),
                new SurfaceContext("wall", SurfaceKind.Wall, 4, 2.5),
            ],
            [radiator]));
        Assert.Equal("khalifa-marshall-1990/window-above-radiator", Device(selection, 0));
        Assert.Equal("khalifa-marshall-1990/wall-radiator-room", Device(selection, 1));
        Assert.Equal("khalifa-marshall-1990/wall-beside-radiator", Device(selection, 2));
        Assert.Equal("khalifa-marshall-1990/wall-radiator-room", Device(selection, 3));
        Assert.True(selection.Surfaces[1].Parts.Single(p => p.Kind == PartKind.Heater).Chosen[0].IsNearMatch);
    }

    [Fact]
    public void WindowForms_RoomWithoutHeater_AreNeverOffered()
    {
        SurfaceSelection selection = Alone(new SurfaceContext("window", SurfaceKind.Window, 2, 1.5));
        Assert.All(
            selection.Parts.SelectMany(p => p.Chosen.Select(c => c.Correlation).Concat(p.Alternatives.Select(a => a.Correlation))),
            c => Assert.NotEqual("khalifa-marshall-1990", c.Publication.Key));
    }

    [Fact]
    public void CeilingDiffuser_Walls_UseInterceptFormsBelowAndThroughZeroFormsAbove()
    {
        RoomSelection selection = RoomSelection.Choose(TestRooms.All[3]);
        SelectedPart part = selection.Surfaces[2].Parts.Single(p => p.Kind == PartKind.Forced);
        Assert.Equal(["fisher-1995/ceiling-diffuser-wall", "fisher-pedersen-1997/ceiling-diffuser-wall"], part.Chosen.Select(c => c.Correlation.Id.ToString()));
    }

    [Fact]
    public void Policy_ExcludePreferAndRequire_AreFollowedAndExplained()
    {
        CorrelationId vertical = CorrelationId.Parse("alamdari-hammond-1983/vertical");
        CorrelationId plate = CorrelationId.Parse("churchill-chu-1975/vertical-all");
        var wall = new SurfaceContext("wall", SurfaceKind.Wall, 4, 2.5);

        SurfaceSelection excluded = Alone(wall, new() { Exclude = [vertical] });
        Assert.NotEqual(vertical.ToString(), Chosen(excluded, SurfaceSide.Warmer));
        Assert.Contains(excluded.Parts[0].Alternatives, a => a.Correlation.Id == vertical && a.Reason == "excluded by the policy");

        SurfaceSelection preferred = Alone(wall, new() { Prefer = [plate] });
        Assert.Equal(plate.ToString(), Chosen(preferred, SurfaceSide.Warmer));
        Assert.Contains("preferred by the policy", preferred.Parts[0].Chosen[0].Reasons);

        SurfaceSelection quoted = Alone(wall, new() { WeakestTextCheck = TextCheck.Quoted, WeakestEvidence = EvidenceKind.Plate });
        Assert.All(quoted.Parts.SelectMany(p => p.Chosen), c => Assert.Equal(TextCheck.Quoted, c.Correlation.TextCheck));
        Assert.Contains(quoted.Parts[0].Alternatives, a => a.Correlation.Id == vertical && a.Reason.Contains("less well checked", StringComparison.Ordinal));
        Assert.Contains(quoted.Parts[0].Alternatives, a => a.Reason.Contains("weaker than the policy asks", StringComparison.Ordinal));
    }

    [Fact]
    public void Pin_FittingOneSide_ServesThatSideOnly()
    {
        var floor = new SurfaceContext("floor", SurfaceKind.Floor, 4, 4);
        SurfaceSelection selection = Alone(floor, new() { Pins = [new SurfacePin("floor", CorrelationId.Parse("min-1956/floor-heated-or-ceiling-cooled"))] });
        Assert.Equal("min-1956/floor-heated-or-ceiling-cooled", Chosen(selection, SurfaceSide.Warmer));
        Assert.Equal("alamdari-hammond-1983/horizontal-stable", Chosen(selection, SurfaceSide.Cooler));
        Assert.True(selection.Parts[0].Chosen[0].IsPinned);
    }

    [Fact]
    public void Pin_MadeForAnotherSurface_IsHonouredAndSaidSo()
    {
        var wall = new SurfaceContext("wall", SurfaceKind.Wall, 4, 2.5);
        SurfaceSelection selection = Alone(wall, new() { Pins = [new SurfacePin("wall", CorrelationId.Parse("khalifa-marshall-1990/ceiling-radiator-room"))] });
        SelectedLaw law = selection.Parts.Single(p => p.Kind == PartKind.StillAir).Chosen.Single();
        Assert.True(law.IsPinned && law.IsNearMatch);
        Assert.Contains(law.Reasons, r => r.Contains("made for ceilings", StringComparison.Ordinal) && r.Contains("not for this surface", StringComparison.Ordinal));
    }

    [Fact]
    public void Pin_FlowLaw_ServesTheDeviceAlone()
    {
        RoomContext room = TestRooms.All[3];
        var pin = new SurfacePin("west", CorrelationId.Parse("fisher-1995/ceiling-diffuser-wall"));
        SurfaceSelection west = RoomSelection.Choose(room, policy: new() { Pins = [pin] }).Surfaces[2];
        Assert.Equal("fisher-1995/ceiling-diffuser-wall", west.Parts.Single(p => p.Kind == PartKind.Forced).Chosen.Single().Correlation.Id.ToString());
    }

    [Theory]
    [InlineData("wall", "alamdari-hammond-1983/verticle", "Of that publication it holds: alamdari-hammond-1983/horizontal-stable")]
    [InlineData("wal", "alamdari-hammond-1983/vertical", "Its surfaces: 'wall'")]
    [InlineData("wall", "fisher-1995/ceiling-diffuser-wall", "depends on a supply flow, which no device of room 'r' gives")]
    public void Pin_OfWhatIsNotThere_IsRefusedWithTheNames(string surface, string id, string expected)
    {
        var policy = new ConvectionPolicy { Pins = [new SurfacePin(surface, CorrelationId.Parse(id))] };
        ArgumentException error = Assert.Throws<ArgumentException>(() => Alone(new SurfaceContext("wall", SurfaceKind.Wall, 4, 2.5), policy));
        Assert.Contains(expected, error.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void Pin_OfATotalCoefficient_IsRefused()
    {
        Correlation convective = PublishedLiterature.Registry["iso-6946-2017/wall"];
        var total = new Correlation
        {
            Id = CorrelationId.Parse("iso-6946-2017/total"),
            Title = "total",
            Publication = convective.Publication,
            Family = CorrelationFamily.Total,
            Applies = convective.Applies,
            Law = convective.Law,
            Reference = ReferenceTemperature.Operative,
            Range = convective.Range,
            Evidence = convective.Evidence,
            TextCheck = convective.TextCheck,
        };
        CorrelationRegistry registry = PublishedLiterature.Registry.With(total);
        var wall = new SurfaceContext("wall", SurfaceKind.Wall, 4, 2.5);
        var room = new RoomContext("r", 40, [wall]);
        Assert.Contains(
            "contains radiation",
            Assert.Throws<ArgumentException>(() => RoomSelection.Choose(room, registry, new() { Pins = [new SurfacePin("wall", total.Id)] })).Message,
            StringComparison.Ordinal);
        SurfaceSelection selection = RoomSelection.Choose(room, registry).Surfaces[0];
        Assert.DoesNotContain(selection.Parts.SelectMany(p => p.Alternatives), a => a.Correlation.Id == total.Id);
    }

    [Fact]
    public void EmptyRegistry_Wall_IsAGapAndGetsNoNumber()
    {
        RoomConvection bound = RoomConvection.Bind(new RoomContext("r", 40, [new SurfaceContext("wall", SurfaceKind.Wall, 4, 2.5)]), CorrelationRegistry.Empty);
        Assert.Equal(2, bound.Selection.Surfaces[0].Gaps.Count);
        ConvectionResult result = bound.Surfaces[0].Evaluate(25, 20, DeviceState.Off);
        Assert.Equal(ConvectionStatus.NoCorrelation, result.Status);
        Assert.True(double.IsNaN(result.FluxWattsPerSquareMetre));
    }

    private static bool Covers(SurfaceSelection surface, PartKind kind, FlowDescriptor? device)
    {
        SurfaceSide[] sides = [.. surface.Parts.Where(p => p.Kind == kind && p.Device == device).Select(p => p.Side)];
        return sides.Contains(SurfaceSide.Either) || (sides.Contains(SurfaceSide.Warmer) && sides.Contains(SurfaceSide.Cooler));
    }

    private static SurfaceSelection Alone(SurfaceContext surface, ConvectionPolicy? policy = null)
        => RoomSelection.Choose(new RoomContext("r", 40, [surface]), policy: policy).Surfaces[0];

    private static string Chosen(SurfaceSelection selection, SurfaceSide side)
        => selection.Parts.Single(p => p.Kind == PartKind.StillAir && (p.Side == side || p.Side == SurfaceSide.Either)).Chosen.Single().Correlation.Id.ToString();

    private static string Device(RoomSelection selection, int surface)
        => selection.Surfaces[surface].Parts.Single(p => p.Kind == PartKind.Heater).Chosen.Single().Correlation.Id.ToString();
}
