using System;
using System.Collections.Generic;
using Convection.Correlations.Registry;
using UnitsNet;

namespace Convection.Correlations.Evaluation;

/// <summary>What convection does at one surface at one step.</summary>
/// <remarks>
/// The default value is not evaluated, and its numbers are NaN, as are those of every result that is not
/// <see cref="ConvectionStatus.Valid"/>: a number is never made up.
/// </remarks>
public readonly struct ConvectionResult : IEquatable<ConvectionResult>
{
    private readonly Flux total;
    private readonly double buoyant, forced, roomDifference, buoyantCoefficient, forcedCoefficient;
    private readonly ReferenceTemperature forcedReference;
    private readonly CorrelationId[]? ids;
    private readonly ulong used;

    internal ConvectionResult(ConvectionStatus status) => Status = status;

    internal ConvectionResult(
        Flux total,
        double buoyant,
        double forced,
        double roomDifference,
        double buoyantCoefficient,
        double forcedCoefficient,
        ReferenceTemperature forcedReference,
        FlowRegime regime,
        ConvectionFlags flags,
        CorrelationId[] ids,
        ulong used)
    {
        Status = ConvectionStatus.Valid;
        this.total = total;
        this.buoyant = buoyant;
        this.forced = forced;
        this.roomDifference = roomDifference;
        this.buoyantCoefficient = buoyantCoefficient;
        this.forcedCoefficient = forcedCoefficient;
        this.forcedReference = forcedReference;
        Regime = regime;
        Flags = flags;
        this.ids = ids;
        this.used = used;
    }

    /// <summary>Whether the numbers hold.</summary>
    public ConvectionStatus Status { get; }

    /// <summary>True where the numbers hold.</summary>
    public bool IsValid => Status == ConvectionStatus.Valid;

    /// <summary>What moves the air.</summary>
    public FlowRegime Regime { get; }

    /// <summary>What should be known about the numbers.</summary>
    public ConvectionFlags Flags { get; }

    /// <summary>Heat flux q [W/m²], positive from the surface into the air.</summary>
    public double FluxWattsPerSquareMetre => IsValid ? total.Value : double.NaN;

    /// <summary>∂q/∂T_surface [W/(m²·K)].</summary>
    public double FluxPerSurfaceKelvin => IsValid ? total.Surface : double.NaN;

    /// <summary>∂q/∂T_room [W/(m²·K)].</summary>
    public double FluxPerRoomKelvin => IsValid ? total.Room : double.NaN;

    /// <summary>∂q/∂T_supply [W/(m²·K)], all supply and stream temperatures that the state gives moving together.</summary>
    public double FluxPerSupplyKelvin => IsValid ? total.Supply : double.NaN;

    /// <summary>Coefficient h of the larger part [W/(m²·K)], against <see cref="Reference"/>; other references have other values.</summary>
    public double CoefficientWattsPerSquareMetreKelvin => !IsValid ? double.NaN : ForcedLeads ? forcedCoefficient : buoyantCoefficient;

    /// <summary>Temperature that <see cref="CoefficientWattsPerSquareMetreKelvin"/> is taken against.</summary>
    public ReferenceTemperature Reference => !IsValid ? ReferenceTemperature.Unspecified : ForcedLeads ? forcedReference : ReferenceTemperature.RoomAir;

    /// <summary>
    /// q/(T_surface − T_room) [W/(m²·K)]: what a model that knows room air only would have to use. NaN where the surface is as
    /// warm as the room and heat flows all the same. Negative where heat flows against that difference.
    /// </summary>
    public double RoomAirCoefficientWattsPerSquareMetreKelvin
        => !IsValid ? double.NaN
            : Math.Abs(roomDifference) > 1e-9 ? total.Value / roomDifference
            : forced == 0 ? buoyantCoefficient
            : double.NaN;

    /// <summary>Buoyant flux before blending [W/m²], a heater's plume included.</summary>
    public double BuoyantFluxWattsPerSquareMetre => IsValid ? buoyant : double.NaN;

    /// <summary>Forced flux before blending [W/m²], of all devices together.</summary>
    public double ForcedFluxWattsPerSquareMetre => IsValid ? forced : double.NaN;

    /// <summary>Coefficient of the buoyant part [W/(m²·K)], against room air.</summary>
    public double BuoyantCoefficientWattsPerSquareMetreKelvin => IsValid ? buoyantCoefficient : double.NaN;

    /// <summary>Coefficient of the forced part [W/(m²·K)], that of the strongest device, against <see cref="ForcedReference"/>; zero without forced flow.</summary>
    public double ForcedCoefficientWattsPerSquareMetreKelvin => IsValid ? forcedCoefficient : double.NaN;

    /// <summary>Temperature that the forced part's coefficient is taken against; unspecified without forced flow.</summary>
    public ReferenceTemperature ForcedReference => forcedReference;

    /// <summary>Share of the forced flux, |q_forced|/(|q_buoyant| + |q_forced|) [-], 0 to 1; 0 where both are zero.</summary>
    public double ForcedShare
    {
        get
        {
            double sum = Math.Abs(buoyant) + Math.Abs(forced);
            return !IsValid ? double.NaN : sum == 0 ? 0 : Math.Abs(forced) / sum;
        }
    }

    /// <summary>Share of the buoyant flux [-], 1 less the forced share.</summary>
    public double BuoyantShare => 1 - ForcedShare;

    /// <summary>Heat flux, positive from the surface into the air; null where there is none, because quantities hold no NaN.</summary>
    public HeatFlux? HeatFlux => IsValid ? UnitsNet.HeatFlux.FromWattsPerSquareMeter(FluxWattsPerSquareMetre) : null;

    /// <summary>Coefficient of the larger part, against <see cref="Reference"/>; null where there is none.</summary>
    public HeatTransferCoefficient? Coefficient => Quantity(CoefficientWattsPerSquareMetreKelvin);

    /// <summary>Coefficient referred to room air; null where there is none.</summary>
    public HeatTransferCoefficient? RoomAirCoefficient => Quantity(RoomAirCoefficientWattsPerSquareMetreKelvin);

    /// <summary>The tangent of the flux, for an implicit heat balance.</summary>
    /// <param name="surfaceCelsius">Temperature of the surface that this result was evaluated at [°C].</param>
    /// <param name="roomCelsius">Temperature of the room air that this result was evaluated at [°C].</param>
    /// <returns>The tangent; NaN in every member where the result is not valid.</returns>
    public LinearFlux Linearise(double surfaceCelsius, double roomCelsius) => new(
        FluxPerSurfaceKelvin,
        FluxPerRoomKelvin,
        FluxWattsPerSquareMetre - (FluxPerSurfaceKelvin * surfaceCelsius) - (FluxPerRoomKelvin * roomCelsius));

    /// <summary>The correlations behind the numbers. Makes a list at each call.</summary>
    public IReadOnlyList<CorrelationId> Correlations
    {
        get
        {
            var list = new List<CorrelationId>();
            for (int i = 0; ids is not null && i < ids.Length; i++)
            {
                if ((used & (1UL << i)) != 0)
                {
                    list.Add(ids[i]);
                }
            }

            return list;
        }
    }

    private static HeatTransferCoefficient? Quantity(double wattsPerSquareMetreKelvin)
        => double.IsNaN(wattsPerSquareMetreKelvin) ? null : HeatTransferCoefficient.FromWattsPerSquareMeterKelvin(wattsPerSquareMetreKelvin);

    private bool ForcedLeads => Math.Abs(forced) > Math.Abs(buoyant);

    /// <summary>Compares every member.</summary>
    /// <param name="left">One result.</param>
    /// <param name="right">Another.</param>
    /// <returns>True when equal.</returns>
    public static bool operator ==(ConvectionResult left, ConvectionResult right) => left.Equals(right);

    /// <summary>Compares every member.</summary>
    /// <param name="left">One result.</param>
    /// <param name="right">Another.</param>
    /// <returns>True when different.</returns>
    public static bool operator !=(ConvectionResult left, ConvectionResult right) => !left.Equals(right);

    /// <inheritdoc/>
    public bool Equals(ConvectionResult other)
        => Status == other.Status && Regime == other.Regime && Flags == other.Flags && used == other.used
            && FluxWattsPerSquareMetre.Equals(other.FluxWattsPerSquareMetre)
            && FluxPerSurfaceKelvin.Equals(other.FluxPerSurfaceKelvin)
            && FluxPerRoomKelvin.Equals(other.FluxPerRoomKelvin)
            && FluxPerSupplyKelvin.Equals(other.FluxPerSupplyKelvin)
            && buoyant.Equals(other.buoyant) && forced.Equals(other.forced)
            && CoefficientWattsPerSquareMetreKelvin.Equals(other.CoefficientWattsPerSquareMetreKelvin);

    /// <inheritdoc/>
    public override bool Equals(object? obj) => obj is ConvectionResult other && Equals(other);

    /// <inheritdoc/>
    public override int GetHashCode() => unchecked((FluxWattsPerSquareMetre.GetHashCode() * 31) + (int)Status);

    /// <summary>Flux, coefficient with its reference, regime and correlations in one line.</summary>
    /// <returns>The text, the same in every culture.</returns>
    public override string ToString() => ResultText.Line(this);
}
