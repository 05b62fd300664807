using System;
using System.Collections.Generic;
using Convection.Correlations.Flows;
using Convection.Correlations.Jets;
using Convection.Correlations.Laws;
using Convection.Correlations.Registry;
using Convection.Correlations.Rooms;
using Convection.Correlations.Surfaces;

namespace Convection.Correlations.Selection;

/// <summary>Chooses the correlations of one surface.</summary>
internal sealed class SurfaceSelector
{
    private const double PassiveNominalKelvins = 2, ActiveNominalKelvins = 5;

    private static readonly SurfaceSide[] Sides = [SurfaceSide.Warmer, SurfaceSide.Cooler];
    private static readonly StillAir NoDevice = new("still air");

    private readonly RoomContext room;
    private readonly CorrelationRegistry registry;
    private readonly ConvectionPolicy policy;
    private readonly SurfaceContext surface;
    private readonly LawBinding warmer, cooler;
    private readonly List<SelectedPart> parts = [];
    private readonly List<SelectionGap> gaps = [];
    private readonly List<Correlation> pins = [];
    private readonly HashSet<CorrelationId> usedPins = [];

    public SurfaceSelector(RoomContext room, SurfaceContext surface, CorrelationRegistry registry, ConvectionPolicy policy, LawBinding warmer, LawBinding cooler)
    {
        this.room = room;
        this.surface = surface;
        this.registry = registry;
        this.policy = policy;
        this.warmer = warmer;
        this.cooler = cooler;
        foreach (SurfacePin pin in policy.Pins)
        {
            if (string.Equals(pin.Surface, surface.Name, StringComparison.Ordinal))
            {
                pins.Add(registry[pin.Correlation]);
            }
        }
    }

    public SurfaceSelection Select()
    {
        AddStillAir();
        foreach (FlowDescriptor device in room.Devices)
        {
            AddDevice(device);
        }

        foreach (Correlation pin in pins)
        {
            if (!usedPins.Contains(pin.Id))
            {
                throw new ArgumentException(
                    "The correlation '" + pin.Id + "', pinned to surface '" + surface.Name + "', depends on " + FormulaText.Name(pin.Law.DrivenBy)
                        + ", which no device of room '" + room.Name + "' gives. Its devices: " + room.DeviceNames + ".",
                    "policy");
            }
        }

        if (SurfaceForm.IsInclined(surface) && !parts.Exists(p => p.Kind == PartKind.StillAir && (p.Ladder[0].Correlation.Applies.Surfaces & SurfaceSet.Inclined) != 0))
        {
            AddGap(PartKind.StillAir, SurfaceSide.Either, null, "No correlation of this registry covers a surface tilted " + InvariantText.Number(surface.TiltDegrees, "°")
                + "; the form of a " + SurfaceForm.NearestWord(surface) + " is used.");
        }

        return new SurfaceSelection(surface, parts, gaps);
    }

    private static bool IsStillAir(Correlation c)
        => c.Family is CorrelationFamily.Buoyant or CorrelationFamily.FixedValue
            && c.Applies.Driver is FlowDriver.StillAir or FlowDriver.SelfHeated or FlowDriver.Panel;

    private static bool IsByDifference(Correlation c) => c.Law.DrivenBy is DrivingVariable.TemperatureDifference or DrivingVariable.None;

    private static bool Gives(FlowDescriptor device, DrivingVariable variable) => variable switch
    {
        DrivingVariable.Speed => (device.Needs & StateNeed.Speed) != 0,
        DrivingVariable.JetMomentum => device is SupplyInlet { OpeningSquareMetres: not null },
        DrivingVariable.FlowPerLength => device is CeilingSlot { FacadeMetres: not null },
        DrivingVariable.AirChangeRate => (device.Needs & StateNeed.Flow) != 0,
        _ => (device.Needs & StateNeed.OutputFraction) != 0,
    };

    private bool IsActive(SurfaceSide side)
        => (surface.Role == SurfaceRole.Heated && side == SurfaceSide.Warmer) || (surface.Role == SurfaceRole.Chilled && side == SurfaceSide.Cooler);

    private double Nominal(SurfaceSide side) => IsActive(side) ? ActiveNominalKelvins : PassiveNominalKelvins;

    private string NominalText(SurfaceSide side) => InvariantText.Number(Nominal(side), "K");

    private void AddStillAir()
    {
        Correlation[] stillAirPins = [.. pins.FindAll(c => IsByDifference(c) && !HasDevice(c.Applies.Driver))];
        var found = new List<SelectedPart>();
        foreach (SurfaceSide side in Sides)
        {
            Correlation? pinned = PinFor(stillAirPins, side);
            SelectedPart? part = Choose(PartKind.StillAir, side, null, pinned, c => IsStillAir(c) ? StillAirDriver(c, side) : null);
            if (part is null)
            {
                AddGap(PartKind.StillAir, side, null, "No correlation of this registry covers a " + SurfaceForm.Word(surface, side) + " in still air; no flux can be given there.");
                continue;
            }

            Correlation chosen = part.Ladder[0].Correlation;
            if (IsActive(side) && pinned is null && chosen.Applies.Driver == FlowDriver.StillAir)
            {
                AddGap(PartKind.StillAir, side, null, "No correlation of this registry covers a " + SurfaceForm.Word(surface, side) + "; the one for still air is used.");
            }

            found.Add(part);
        }

        AddMerged(found);
    }

    private void AddDevice(FlowDescriptor device)
    {
        if (device.Driver == FlowDriver.StillAir)
        {
            return;
        }

        bool isHeater = (device.Needs & StateNeed.OutputFraction) != 0;
        PartKind kind = isHeater ? PartKind.Heater : PartKind.Forced;
        Placement place = device.PlacementOf(surface.Name);
        if (device.Driver == FlowDriver.AirStream && place != Placement.InStream)
        {
            return;
        }

        Correlation[] devicePins = [.. pins.FindAll(c => c.Applies.Driver == device.Driver
            || (!HasDevice(c.Applies.Driver) && !IsByDifference(c) && Gives(device, c.Law.DrivenBy)))];
        if (devicePins.Length == 0 && SurfaceForm.Of(surface) == SurfaceSet.Ceiling && JetFinding.OfDesign(device, room.Air.Celsius) is { IsAttached: false } jet)
        {
            AddGap(PartKind.Forced, SurfaceSide.Either, device, jet + " No correlation covers such a ceiling; the still-air one stays in force.");
            return;
        }

        var found = new List<SelectedPart>();
        var missing = new List<SurfaceSide>();
        foreach (SurfaceSide side in Sides)
        {
            SelectedPart? part = Choose(
                kind,
                side,
                device,
                PinFor(devicePins, side),
                c => c.Applies.Driver == device.Driver && c.Family != CorrelationFamily.Total && Gives(device, c.Law.DrivenBy) && IsByDifference(c) == isHeater ? 0 : null);
            if (part is null)
            {
                missing.Add(side);
            }
            else
            {
                found.Add(part);
            }
        }

        if (missing.Count > 0)
        {
            SurfaceSide side = missing.Count == 2 ? SurfaceSide.Either : missing[0];
            AddGap(kind, side, device, "No correlation of this registry covers a " + SurfaceForm.Word(surface, side) + " in a room with "
                + Article(device.Description) + " ('" + device.Name + "'); the still-air one stays in force." + OtherwiseDescribed(device, side));
        }

        AddMerged(found);
    }

    private void AddGap(PartKind part, SurfaceSide side, FlowDescriptor? device, string text) => gaps.Add(new SelectionGap(part, side, device, text));

    /// <summary>A pin that fits this side; else one that fits no side and therefore serves both.</summary>
    private Correlation? PinFor(Correlation[] candidates, SurfaceSide side)
        => Array.Find(candidates, c => FitsSide(c, side)) ?? Array.Find(candidates, c => !Array.Exists(Sides, s => FitsSide(c, s)));

    /// <summary>Forms that would serve if surface or device were described otherwise, so that a thin description is not taken for a gap in knowledge.</summary>
    private string OtherwiseDescribed(FlowDescriptor device, SurfaceSide side)
    {
        var conditions = new List<string>();
        foreach (Correlation c in registry.All)
        {
            bool elsewhere = c.Applies.Placement != Placement.Unspecified && device.PlacementOf(surface.Name) != c.Applies.Placement;
            bool unmet = c.Applies.Condition is { } condition && !condition(surface, device);
            if (c.Applies.Driver == device.Driver && (elsewhere || unmet) && policy.Objection(c) is null
                && SurfaceForm.Match(c.Applies.Surfaces, surface) is 0 && (side == SurfaceSide.Either || FitsSide(c, side)))
            {
                conditions.Add(c.Id + (unmet ? " where " + c.Applies.ConditionText : " at another place to the device"));
            }
        }

        return conditions.Count == 0 ? string.Empty : " Described otherwise it could take: " + string.Join("; ", conditions) + ".";
    }

    private static string Article(string words) => (words[0] is 'a' or 'e' or 'i' or 'o' or 'u' ? "an " : "a ") + words;

    private bool HasDevice(FlowDriver driver)
    {
        foreach (FlowDescriptor device in room.Devices)
        {
            if (device.Driver == driver)
            {
                return true;
            }
        }

        return false;
    }

    private void AddMerged(List<SelectedPart> sides)
    {
        if (sides.Count == 2 && SameLaws(sides[0], sides[1]))
        {
            parts.Add(new SelectedPart(sides[0].Kind, SurfaceSide.Either, sides[0].Device, sides[0].Ladder, sides[0].Alternatives));
        }
        else
        {
            parts.AddRange(sides);
        }
    }

    private static bool SameLaws(SelectedPart one, SelectedPart other)
    {
        if (one.Ladder.Count != other.Ladder.Count)
        {
            return false;
        }

        for (int i = 0; i < one.Ladder.Count; i++)
        {
            if (one.Ladder[i].Correlation != other.Ladder[i].Correlation)
            {
                return false;
            }
        }

        return true;
    }

    private SelectedPart? Choose(PartKind kind, SurfaceSide side, FlowDescriptor? device, Correlation? pinned, Func<Correlation, int?> driverScore)
    {
        var admitted = new List<Candidate>();
        var setAside = new List<Alternative>();
        foreach (Correlation c in registry.All)
        {
            int? driver = driverScore(c);
            if (c == pinned || c.IsReferenceOnly || driver is null || !Fits(c, side, device, out int match))
            {
                continue;
            }

            if (policy.Objection(c) is { } objection)
            {
                setAside.Add(new Alternative(c, objection));
            }
            else
            {
                admitted.Add(MakeCandidate(c, side, device, driver.Value, match, isPinned: false));
            }
        }

        if (pinned is not null)
        {
            usedPins.Add(pinned.Id);
            int match = SurfaceForm.Match(pinned.Applies.Surfaces, surface) ?? Ranking.Misfit;
            admitted.Add(MakeCandidate(pinned, side, device, driverScore(pinned) ?? Ranking.Misfit, match, isPinned: true));
        }

        if (admitted.Count == 0)
        {
            return null;
        }

        admitted.Sort();
        Candidate best = admitted[0];
        List<SelectedLaw> laws = [];
        foreach (Candidate candidate in admitted)
        {
            bool extendsFlow = kind == PartKind.Forced && pinned is null
                && candidate.Law.DrivenBy == best.Law.DrivenBy && candidate.Correlation.Reference == best.Correlation.Reference;
            if (candidate == best || extendsFlow)
            {
                laws.Add(new SelectedLaw(candidate, Ranking.Praise(candidate, NominalText(side))));
            }
        }

        LawLadder ladder = LawLadder.Build(laws);
        var chosen = new HashSet<CorrelationId>();
        foreach (SelectedLaw law in ladder.Laws)
        {
            chosen.Add(law.Correlation.Id);
        }

        var alternatives = new List<Alternative>();
        foreach (Candidate candidate in admitted)
        {
            if (!chosen.Contains(candidate.Correlation.Id))
            {
                alternatives.Add(new Alternative(candidate.Correlation, Ranking.Shortfall(candidate, best, NominalText(side))));
            }
        }

        alternatives.AddRange(setAside);
        return new SelectedPart(kind, side, device, ladder, alternatives);
    }

    private Candidate MakeCandidate(Correlation c, SurfaceSide side, FlowDescriptor? device, int driver, int match, bool isPinned)
    {
        var scores = new int[Ranking.Criteria];
        scores[Ranking.Preferred] = isPinned || policy.Prefers(c.Id) ? 0 : 1;
        scores[Ranking.Driver] = driver;
        scores[Ranking.Specific] = c.Applies.Condition is null ? 1 : 0;
        scores[Ranking.Surface] = match;
        scores[Ranking.Place] = device is not null && c.Applies.Placement != Placement.Unspecified ? 0 : 1;
        scores[Ranking.Evidence] = c.Family == CorrelationFamily.FixedValue ? (int)EvidenceKind.Standard + 1 : (int)c.Evidence.Kind;
        scores[Ranking.Text] = (int)c.TextCheck;
        scores[Ranking.KnownRange] = c.Range.IsKnown ? 0 : 1;
        return new Candidate(c, side == SurfaceSide.Warmer ? warmer : cooler, Nominal(side), scores) { IsPinned = isPinned };
    }

    private bool FitsSide(Correlation c, SurfaceSide side)
        => (c.Applies.Side == SurfaceSide.Either || c.Applies.Side == side)
            && SurfaceForm.Fits(c.Applies.Sense, surface, side);

    private bool Fits(Correlation c, SurfaceSide side, FlowDescriptor? device, out int match)
    {
        int? found = SurfaceForm.Match(c.Applies.Surfaces, surface);
        match = found ?? Ranking.Misfit;
        return found is not null
            && FitsSide(c, side)
            && (c.Applies.Placement == Placement.Unspecified || device?.PlacementOf(surface.Name) == c.Applies.Placement)
            && (c.Applies.Condition is null || c.Applies.Condition(surface, device ?? NoDevice));
    }

    /// <summary>
    /// How exactly a still-air law's driver meets the surface. A heated or chilled surface is met by panels and by surfaces heated by
    /// themselves in a room or chamber; still air comes second, an isolated plate third.
    /// </summary>
    private int? StillAirDriver(Correlation c, SurfaceSide side)
        => c.Family == CorrelationFamily.FixedValue ? 3
            : c.Applies.Driver == FlowDriver.Panel ? (IsActive(side) ? 0 : null)
            : !IsActive(side) ? (c.Applies.Driver == FlowDriver.StillAir ? 0 : 1)
            : c.Applies.Driver == FlowDriver.StillAir ? 1
            : c.Evidence.Kind <= EvidenceKind.ClimateChamber ? 0
            : 2;
}
