using System;
using System.Collections.Generic;
using System.Linq;
using Convection.Correlations.Air;
using Convection.Correlations.Flows;
using Convection.Correlations.Laws;
using Convection.Correlations.Literature;
using Convection.Correlations.Registry;
using Convection.Correlations.Surfaces;
using Xunit;

namespace Convection.Correlations.Tests.Registry;

public class CorrelationRegistryTests
{
    private static readonly CorrelationRegistry Published = PublishedLiterature.Registry;

    [Fact]
    public void Lookup_KnownAndUnknown_ThreeWays()
    {
        CorrelationId id = CorrelationId.Parse("min-1956/wall");
        Assert.Same(Published[id], Published["min-1956/wall"]);
        Assert.Same(Published[id], Published.GetOrNull(id));
        Assert.True(Published.TryGet(id, out Correlation? found) && found.Id == id);
        Assert.Null(Published.GetOrNull(CorrelationId.Parse("min-1956/roof")));
        Assert.False(Published.TryGet(CorrelationId.Parse("a/b"), out _));
        Assert.Contains("it holds: min-1956/ceiling-heated", Assert.Throws<KeyNotFoundException>(() => Published["min-1956/roof"]).Message, StringComparison.Ordinal);
        Assert.Contains("Nothing of that publication", Assert.Throws<KeyNotFoundException>(() => Published["nobody-1900/x"]).Message, StringComparison.Ordinal);
        Assert.Contains("looks like 'author-year/case'", Assert.Throws<FormatException>(() => Published["Min 1956"]).Message, StringComparison.Ordinal);
    }

    [Fact]
    public void Query_EachMember_Narrows()
    {
        Assert.Equal(Published.Count, Published.Query(new()).Count);
        Assert.All(Published.Query(new() { Surfaces = SurfaceSet.Window }), c => Assert.True((c.Applies.Surfaces & SurfaceSet.Window) != 0));
        Assert.Equal(4, Published.Query(new() { Driver = FlowDriver.Radiator }).Count);
        Assert.Equal(10, Published.Query(new() { Family = CorrelationFamily.FixedValue }).Count);
        Assert.All(Published.Query(new() { Reference = ReferenceTemperature.OutletAir }), c => Assert.Equal("spitler-1991", c.Publication.Key));
        Assert.Equal(8, Published.Query(new() { PublicationKey = "khalifa-marshall-1990" }).Count);
        Assert.All(Published.Query(new() { WeakestTextCheck = TextCheck.Quoted }), c => Assert.Equal(TextCheck.Quoted, c.TextCheck));
        Assert.Throws<ArgumentNullException>(() => Published.Query(null!));
    }

    [Fact]
    public void WithAndWithout_MakeOthers_AndLeaveTheFirstAlone()
    {
        Correlation own = Own();
        CorrelationRegistry larger = Published.With(own);
        Assert.Equal(Published.Count + 1, larger.Count);
        Assert.Same(own, larger[own.Id]);
        Assert.Equal(PublishedLiterature.DataVersion + "+changed", larger.DataVersion);
        Assert.Equal(PublishedLiterature.DataVersion + "+changed", larger.Without(own.Id).DataVersion);
        Assert.Equal(Published.All, larger.Without(own.Id).All);
        Assert.Equal(118, Published.Count);
        Assert.Contains("its id is taken", Assert.Throws<CorrelationContractException>(() => larger.With(own)).Message, StringComparison.Ordinal);
        Assert.Throws<KeyNotFoundException>(() => Published.Without(own.Id));
        Assert.Throws<ArgumentNullException>(() => Published.With(null!));
        Assert.Equal(0, CorrelationRegistry.Empty.Count);
        Assert.Equal(larger.All.OrderBy(c => c.Id.ToString(), StringComparer.Ordinal), larger.All);
    }

    public static TheoryData<string, string> Broken() => new()
    {
        { "id", "its publication's key is not the first part of its id" },
        { "forced by difference", "a forced law depends on a flow or speed" },
        { "buoyant by flow", "a buoyant law depends on the temperature difference" },
        { "operative", "only coefficients that contain radiation" },
        { "mixed", "a mixed law contains buoyancy" },
        { "fixed", "a fixed value depends on nothing" },
        { "intercept", "needs a lowest tested flow" },
        { "words", "a further condition and its words go together" },
        { "sense", "its sense of heat flow is not given" },
    };

    [Theory]
    [MemberData(nameof(Broken))]
    public void Correlation_WhosePartsDoNotFit_IsRefusedWithTheReason(string fault, string expected)
    {
        var flow = new FlowLaw(DrivingVariable.AirChangeRate, 0, 0.5, 0.8);
        Correlation broken = fault switch
        {
            "id" => Own("other-2026/wall"),
            "forced by difference" => Own(family: CorrelationFamily.Forced),
            "buoyant by flow" => Own(law: flow),
            "operative" => Own(reference: ReferenceTemperature.Operative, family: CorrelationFamily.Mixed, containsBuoyancy: true),
            "mixed" => Own(family: CorrelationFamily.Mixed, containsBuoyancy: false),
            "fixed" => Own(family: CorrelationFamily.FixedValue),
            "intercept" => Own(family: CorrelationFamily.Forced, law: new FlowLaw(DrivingVariable.AirChangeRate, 0.7, 0.5, 0.8)),
            "words" => Own(applies: new() { Surfaces = SurfaceSet.Wall, Driver = FlowDriver.StillAir, Condition = (_, _) => true }),
            _ => Own(applies: new() { Surfaces = SurfaceSet.Wall, Driver = FlowDriver.StillAir, Sense = HeatFlowSense.Unspecified }),
        };
        CorrelationContractException error = Assert.Throws<CorrelationContractException>(() => Published.With(broken));
        Assert.Contains(expected, error.Message, StringComparison.Ordinal);
        Assert.Equal(broken.Id, error.Id);
    }

    [Theory]
    [InlineData("a/b", true)]
    [InlineData("khalifa-marshall-1990/wall-beside-radiator", true)]
    [InlineData("", false)]
    [InlineData("a", false)]
    [InlineData("a/b/c", false)]
    [InlineData("A/b", false)]
    [InlineData("a /b", false)]
    [InlineData("a-/b", false)]
    [InlineData(null, false)]
    public void Id_Text_IsWellFormedOrNot(string? text, bool expected)
    {
        Assert.Equal(expected, CorrelationId.TryParse(text, out CorrelationId id));
        Assert.Equal(!expected, id.IsNone);
        if (expected)
        {
            Assert.Equal(text, id.ToString());
            Assert.Equal(text, id.PublicationKey + "/" + id.Case);
            Assert.True(id == CorrelationId.Parse(text!) && id.GetHashCode() == CorrelationId.Parse(text!).GetHashCode() && id != default);
        }
    }

    [Fact]
    public void Id_Default_NamesNothing()
    {
        CorrelationId none = default;
        Assert.Equal(string.Empty, none.ToString() + none.PublicationKey + none.Case);
        Assert.True(CorrelationId.Parse("a/b") > none && none < CorrelationId.Parse("a/b") && none <= default(CorrelationId) && none >= default(CorrelationId));
        Assert.False(none.Equals("a/b"));
    }

    [Fact]
    public void EveryShipped_CarriesWhatTheDesignAsksFor()
    {
        foreach (Correlation c in Published.All)
        {
            Assert.NotEmpty(c.Publication.Citation);
            Assert.Contains(c.Publication.Year.ToString(System.Globalization.CultureInfo.InvariantCulture), c.Publication.Citation, StringComparison.Ordinal);
            Assert.NotEmpty(c.Evidence.Setting);
            Assert.NotEmpty(c.Doubts);
            Assert.Contains(c.Id.ToString(), c.ToString(), StringComparison.Ordinal);
            Assert.Equal(c.TextCheck >= TextCheck.RecalledMedium, c.IsUnconfirmed && c.TextCheck >= TextCheck.RecalledMedium);
        }
    }

    /// <summary>Flags stand on the right sides of every limit of every shipped law that has one in its own variable.</summary>
    [Fact]
    public void EveryShippedRange_BothSidesOfEachLimit_AreJudgedRight()
    {
        AirProperties air = new AirState(22).Properties;
        int judged = 0;
        foreach (Correlation c in Published.All)
        {
            var binding = new LawBinding(new SurfaceContext("s", SurfaceKind.Wall, 4, 2.5), air);
            BoundRange range = c.Range.Bind(binding, c.Bind(binding));
            foreach ((double limit, RangeStanding inside, RangeStanding outside, double step) in new[]
            {
                (range.TestedLow, RangeStanding.Within, RangeStanding.Below, -1e-9),
                (range.TestedHigh, RangeStanding.Within, RangeStanding.Above, 1e-9),
            })
            {
                if (!double.IsInfinity(limit) && limit != 0 && range.Violations.Count == 0)
                {
                    judged++;
                    RangeStanding within = c.StandingAt(binding, limit * (1 - step)), without = c.StandingAt(binding, limit * (1 + step));
                    Assert.True(within == inside || (within == RangeStanding.OutsideAdvised && limit < range.AdvisedLow), c.Id.ToString());
                    Assert.True(without == outside || (without == RangeStanding.Extended && range.ExtendedLow < limit), c.Id.ToString());
                }
            }
        }

        Assert.True(judged > 40);
    }

    [Fact]
    public void Limits_ReversedOrOutsideEachOther_AreRefused()
    {
        Assert.Contains("its upper end must lie above", Assert.Throws<ArgumentOutOfRangeException>(() => new Interval(2, 1)).Message, StringComparison.Ordinal);
        Assert.Throws<ArgumentOutOfRangeException>(() => new Interval(double.NaN, 1));
        Assert.Throws<ArgumentException>(() => new RangeLimit(RangeVariable.Height, new(1, 2), RangeOrigin.Source) { Advised = new Interval(0, 2) });
        Assert.Throws<ArgumentException>(() => new RangeLimit(RangeVariable.Height, new(1, 2), RangeOrigin.Source) { Extended = new Interval(1.5, 2) });
        Assert.Throws<ArgumentOutOfRangeException>(() => new RangeLimit(RangeVariable.Unspecified, new(1, 2), RangeOrigin.Source));
        Assert.Throws<ArgumentOutOfRangeException>(() => new Evidence(EvidenceKind.Unspecified, "x"));
        Assert.Throws<ArgumentException>(() => new Evidence(EvidenceKind.Plate, " "));
    }

    [Fact]
    public void Range_OfSurfaceAndAirVariables_IsCheckedOrListedAsUnchecked()
    {
        var range = new ValidityRange(
            new RangeLimit(RangeVariable.Height, Interval.UpTo(3), RangeOrigin.Source),
            new RangeLimit(RangeVariable.Tilt, new(80, 100), RangeOrigin.Source),
            new RangeLimit(RangeVariable.Archimedes, Interval.UpTo(0.3), RangeOrigin.Recalled));
        var tall = new SurfaceContext("tall", SurfaceKind.Wall, 4, 5) { TiltDegrees = 120 };
        var law = new PowerLaw(2, 0.25);
        var binding = new LawBinding(tall, new AirState(22).Properties);
        BoundRange bound = range.Bind(binding, law.Bind(binding));
        Assert.Equal(2, bound.Violations.Count);
        Assert.Equal("height 5 m is outside the tested up to 3 m", bound.Violations[0]);
        Assert.Equal("Ar up to 0.3 (recalled)", Assert.Single(bound.Unchecked));
        Assert.Equal(RangeStanding.SurfaceOutside, bound.StandingAt(2));
        Assert.Equal("range not known", ValidityRange.NotKnown.ToString());
    }

    internal static Correlation Own(
        string id = "own-2026/wall",
        CorrelationFamily family = CorrelationFamily.Buoyant,
        Law? law = null,
        ReferenceTemperature reference = ReferenceTemperature.RoomAir,
        bool containsBuoyancy = false,
        Applicability? applies = null) => new()
        {
            Id = CorrelationId.Parse(id),
            Title = "own wall",
            Publication = new() { Key = "own-2026", Authors = "We", Year = 2026, Title = "Own", Source = "unpublished", ShortName = "Own (2026)" },
            Family = family,
            Applies = applies ?? new() { Surfaces = SurfaceSet.Wall, Driver = FlowDriver.StillAir },
            Law = law ?? new PowerLaw(2, 0.25),
            Reference = reference,
            Range = ValidityRange.NotKnown,
            Evidence = new(EvidenceKind.ClimateChamber, "own chamber"),
            TextCheck = TextCheck.FirstHand,
            ContainsBuoyancy = containsBuoyancy,
        };
}
