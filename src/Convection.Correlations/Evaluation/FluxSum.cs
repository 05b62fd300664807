using System;
using Convection.Correlations.Flows;
using Convection.Correlations.Laws;
using Convection.Correlations.Registry;

namespace Convection.Correlations.Evaluation;

/// <summary>What gathers while one surface is evaluated: its buoyant part, its forced parts by stream, flags and laws in use.</summary>
internal struct FluxSum(double difference)
{
    public double Difference = difference;
    public Flux Buoyant;
    public double BuoyantCoefficient;
    public double MixedWeight;
    public double ForcedCoefficient;
    public ReferenceTemperature ForcedReference;
    public ConvectionFlags Flags;
    public ulong Used;
    private double strongest = -1;
    private Flux up, upCold, down, downCold, across, acrossCold;

    public readonly bool HasOppositeDevices
        => (up.Value != 0 || down.Value != 0 || across.Value != 0) && (upCold.Value != 0 || downCold.Value != 0 || acrossCold.Value != 0);

    private readonly bool BuoyancyRises => Difference >= 0;

    /// <summary>Forced fluxes of several devices or directions together.</summary>
    public static Flux Pool(Flux one, Flux other, BlendRule blend)
        => FluxBlend.Assisting(one, other, blend.TransverseExponent, blend.OpposingExponent);

    public bool Use(LawUse use, double x, out LawValue law)
    {
        bool accepted = use.TryEvaluate(x, out law, out ConvectionFlags flags, out ulong used);
        Flags |= flags;
        Used |= used;
        return accepted;
    }

    /// <summary>Devices whose stream runs the same way and whose heat flows the same way add up as in transverse flow.</summary>
    public void AddForced(Flux flux, double coefficient, ReferenceTemperature reference, StreamDirection stream, BlendRule blend)
    {
        bool cold = flux.Value < 0;
        switch (stream)
        {
            case StreamDirection.Up:
                Add(ref cold ? ref upCold : ref up, flux, blend);
                break;
            case StreamDirection.Down:
                Add(ref cold ? ref downCold : ref down, flux, blend);
                break;
            default:
                Add(ref cold ? ref acrossCold : ref across, flux, blend);
                break;
        }

        if (Math.Abs(flux.Value) > strongest)
        {
            strongest = Math.Abs(flux.Value);
            ForcedCoefficient = coefficient;
            ForcedReference = reference;
        }
    }

    /// <summary>Buoyancy gives way to a forced law that contains it.</summary>
    public void GiveWay(double weight)
    {
        Buoyant = Buoyant.Times(1 - weight);
        BuoyantCoefficient *= 1 - weight;
        MixedWeight = Math.Max(MixedWeight, weight);
    }

    public readonly Flux Assisting(BlendRule blend) => BuoyancyRises ? Pool(up, upCold, blend) : Pool(down, downCold, blend);

    public readonly Flux Opposing(BlendRule blend) => BuoyancyRises ? Pool(down, downCold, blend) : Pool(up, upCold, blend);

    public readonly Flux Transverse(BlendRule blend) => Pool(across, acrossCold, blend);

    private static void Add(ref Flux pool, Flux flux, BlendRule blend) => pool = Pool(pool, flux, blend);
}
