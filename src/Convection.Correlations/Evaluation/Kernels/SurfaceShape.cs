using System.Collections.Generic;
using Convection.Correlations.Registry;
using Convection.Correlations.Selection;

namespace Convection.Correlations.Evaluation.Kernels;

/// <summary>A surface's plan without its numbers: what a kernel runs through. Surfaces with equal keys share one.</summary>
internal sealed class SurfaceShape
{
    private readonly Dictionary<LawUse, LawShape> known = [];
    private readonly ConvectionPolicy policy;

    public SurfaceShape(SurfacePlan plan, ConvectionPolicy policy)
    {
        this.policy = policy;
        var numbers = new ShapeNumbers();
        Blend = new BlendShape(policy.Blend);
        HeaterRamp = policy.HeaterRamp;
        MinimumConductance = policy.MinimumConductance;
        numbers.Key(policy.Blend);
        numbers.Key(HeaterRamp);
        numbers.Key(MinimumConductance);

        Warmer = Law(plan.StillAir(true), isForced: false, numbers);
        Cooler = Law(plan.StillAir(false), isForced: false, numbers);
        var heaters = new List<HeaterShape>();
        foreach (HeaterPlan heater in plan.Heaters)
        {
            int slot = Slot(plan, heater.Device, numbers);
            LawUse? warm = heater.On(true), cool = heater.On(false);
            heaters.Add(new HeaterShape(slot, Law(warm, false, numbers), Law(cool, false, numbers), warm?.IsMixed == true, cool?.IsMixed == true));
        }

        Heaters = [.. heaters];
        var forced = new List<ForcedShape>();
        foreach (ForcedPlan device in plan.Forced)
        {
            int slot = Slot(plan, device.Device, numbers);
            int scale = numbers.Next;
            numbers.Add(device.ScaleOfFlow);
            numbers.Key(device.DrivenBy);
            numbers.Key(device.Stream);
            forced.Add(new ForcedShape(slot, device.DrivenBy, scale, device.Stream, Side(device.On(true), numbers), Side(device.On(false), numbers)));
        }

        Forced = [.. forced];
        Numbers = numbers.ToNumbers();
        Key = numbers.ToKey();
    }

    public LawShape? Warmer { get; }

    public LawShape? Cooler { get; }

    public HeaterShape[] Heaters { get; }

    public ForcedShape[] Forced { get; }

    public BlendShape Blend { get; }

    public double HeaterRamp { get; }

    public double MinimumConductance { get; }

    /// <summary>The numbers of the surface that the shape was made from.</summary>
    public double[] Numbers { get; }

    public ShapeKey Key { get; }

    private static int Slot(SurfacePlan plan, int device, ShapeNumbers numbers)
    {
        int slot = System.Array.IndexOf(plan.Devices, device);
        numbers.Key(slot);
        return slot;
    }

    private ForcedSide? Side(LawUse? use, ShapeNumbers numbers)
    {
        if (Law(use, isForced: true, numbers) is not { } law)
        {
            return null;
        }

        numbers.Key(use!.Reference);
        numbers.Key(use.ContainsBuoyancy);
        numbers.Key(use.IsMixed);
        return new ForcedSide(law, use.Reference, use.ContainsBuoyancy, fades: use.Lowest > 0);
    }

    private LawShape? Law(LawUse? use, bool isForced, ShapeNumbers numbers)
    {
        if (use is null)
        {
            numbers.Key("none");
            return null;
        }

        if (known.TryGetValue(use, out LawShape? shared))
        {
            // Both sides share a law: it is evaluated once.
            numbers.Key("shared");
            return shared;
        }

        bool fades = isForced && use.Lowest > 0, holds = policy.OutOfRange == OutOfRangeRule.HoldAtLimit;
        LimitRule limits = fades ? holds ? LimitRule.FadeAndHold : LimitRule.Fade : holds ? LimitRule.Hold : LimitRule.None;
        var law = new LawShape(use.Ladder, limits, use.Lowest, use.Highest, policy.JoinsPieces, numbers);
        known.Add(use, law);
        return law;
    }
}
