using System;
using System.Collections.Generic;
using Convection.Correlations.Flows;
using Convection.Correlations.Registry;
using Convection.Correlations.Rooms;
using Convection.Correlations.Selection;
using Convection.Correlations.Surfaces;

namespace Convection.Correlations.Evaluation;

/// <summary>A surface's choice turned into what evaluation runs through.</summary>
internal sealed class SurfacePlan
{
    private const int MostLaws = 64;

    private readonly RoomSelection room;
    private readonly List<CorrelationId> ids = [];
    private readonly LawUse? warmer, cooler;

    public SurfacePlan(RoomSelection room, SurfaceSelection selection)
    {
        this.room = room;
        Selection = selection;
        var heaters = new List<HeaterPlan>();
        var forced = new List<ForcedPlan>();
        var touched = new SortedSet<int>();
        (warmer, cooler) = Uses(PartKind.StillAir, null);
        for (int device = 0; device < Room.Devices.Count; device++)
        {
            FlowDescriptor descriptor = Room.Devices[device];
            (LawUse? warm, LawUse? cool) = Uses(PartKind.Heater, descriptor);
            if (warm is not null || cool is not null)
            {
                heaters.Add(new HeaterPlan(device, warm, cool));
                touched.Add(device);
            }

            (warm, cool) = Uses(PartKind.Forced, descriptor);
            if ((warm ?? cool) is { } one)
            {
                forced.Add(new ForcedPlan(device, Room, one.Ladder[0].Law.DrivenBy, warm, cool, descriptor.StreamAlong(Surface)));
                touched.Add(device);
            }
        }

        var gaps = new List<GapPlan>();
        foreach (SelectionGap gap in selection.Gaps)
        {
            int device = gap.Device is null ? -1 : Room.IndexOfDevice(gap.Device.Name);
            gaps.Add(new GapPlan(device, gap.Side));
        }

        Gaps = [.. gaps];
        Heaters = [.. heaters];
        Forced = [.. forced];
        Devices = [.. touched];
        Ids = [.. ids];
        if (Ids.Length > MostLaws)
        {
            throw new ArgumentException(
                "Surface '" + Surface.Name + "' would need " + Ids.Length + " correlations at once; at most " + MostLaws
                + " are possible. Describe fewer devices.",
                nameof(room));
        }
    }

    public RoomContext Room => room.Room;

    public SurfaceSelection Selection { get; }

    public SurfaceContext Surface => Selection.Surface;

    public HeaterPlan[] Heaters { get; }

    public ForcedPlan[] Forced { get; }

    public GapPlan[] Gaps { get; }

    /// <summary>The devices whose state this surface needs; one that no correlation covers is none of them.</summary>
    public int[] Devices { get; }

    /// <summary>The correlations that results may name, by bit.</summary>
    public CorrelationId[] Ids { get; }

    public LawUse? StillAir(bool isWarmer) => isWarmer ? warmer : cooler;

    /// <summary>What has to be said about a state that is not impossible: laws in use, flags, and whether the policy refuses it.</summary>
    public Remarks Remark(double surfaceCelsius, double roomCelsius, DeviceStates devices, double heaterRamp)
    {
        var remarks = new Remarks();
        double difference = surfaceCelsius - roomCelsius, size = Math.Abs(difference);
        bool isWarmer = difference >= 0, needsStill = true;
        foreach (HeaterPlan heater in Heaters)
        {
            double weight = HeaterPlan.Weight(devices[heater.Device].OutputFraction, heaterRamp);
            if (weight > 0 && heater.On(isWarmer) is { } use)
            {
                needsStill &= weight < 1;
                remarks.Refuse(!use.Remark(size, ref remarks));
            }
        }

        if (needsStill)
        {
            if (StillAir(isWarmer) is { } still)
            {
                remarks.Refuse(!still.Remark(size, ref remarks));
            }
            else
            {
                remarks.Status = ConvectionStatus.NoCorrelation;
            }
        }

        foreach (ForcedPlan forced in Forced)
        {
            DeviceState state = devices[forced.Device];
            double driving = forced.DrivingValue(state);
            if (driving > 0)
            {
                Remark(forced.On(isWarmer: true), isWarmer: true, driving, state, surfaceCelsius, roomCelsius, ref remarks);
                Remark(forced.On(isWarmer: false), isWarmer: false, driving, state, surfaceCelsius, roomCelsius, ref remarks);
            }
        }

        foreach (GapPlan gap in Gaps)
        {
            remarks.Flags |= gap.IsOn(isWarmer) && (gap.Device < 0 || devices[gap.Device].IsRunning) ? ConvectionFlags.GapInEvidence : ConvectionFlags.None;
        }

        return remarks;
    }

    private static void Remark(LawUse? use, bool isWarmer, double driving, DeviceState state, double surfaceCelsius, double roomCelsius, ref Remarks remarks)
    {
        if (use is null)
        {
            return;
        }

        bool isGiven = use.Reference == ReferenceTemperature.SupplyAir || (use.Reference == ReferenceTemperature.FreeStream && !double.IsNaN(state.AirCelsius));
        if (isWarmer == (surfaceCelsius - (isGiven ? state.AirCelsius : roomCelsius) >= 0))
        {
            remarks.Refuse(!use.Remark(driving, ref remarks));
            remarks.Flags |= isGiven || use.Reference == ReferenceTemperature.RoomAir ? ConvectionFlags.None : ConvectionFlags.ReferenceSubstituted;
        }
    }

    private (LawUse? Warmer, LawUse? Cooler) Uses(PartKind kind, FlowDescriptor? device)
    {
        LawUse? warm = null, cool = null;
        foreach (SelectedPart part in Selection.Parts)
        {
            if (part.Kind != kind || part.Device?.Name != device?.Name)
            {
                continue;
            }

            var use = new LawUse(part.Ladder, room.Policy.OutOfRange, kind == PartKind.Forced, room.IsScaledToAir, ids.Count);
            foreach (SelectedLaw law in part.Chosen)
            {
                ids.Add(law.Correlation.Id);
            }

            warm = part.Side == SurfaceSide.Cooler ? warm : use;
            cool = part.Side == SurfaceSide.Warmer ? cool : use;
        }

        return (warm, cool);
    }
}
