using System;
using Convection.Correlations.Flows;

namespace Convection.Correlations.Jets;

/// <summary>What the terminal's data say of a device's jet in one state.</summary>
public sealed class JetFinding
{
    private JetFinding(SupplyInlet device, double dischargeMetresPerSecond, double archimedes, double separationMetres, double endMetresPerSecond)
    {
        Device = device;
        DischargeMetresPerSecond = dischargeMetresPerSecond;
        Archimedes = archimedes;
        SeparationMetres = separationMetres;
        EndMetresPerSecond = endMetresPerSecond;
    }

    /// <summary>The device.</summary>
    public SupplyInlet Device { get; }

    /// <summary>Mean speed at the terminal [m/s].</summary>
    public double DischargeMetresPerSecond { get; }

    /// <summary>Archimedes number on the slot height [-].</summary>
    public double Archimedes { get; }

    /// <summary>Distance at which a cool jet leaves the ceiling [m]; infinity where the air is not cooler than the room.</summary>
    public double SeparationMetres { get; }

    /// <summary>Largest speed in the jet at the end of its reach [m/s].</summary>
    public double EndMetresPerSecond { get; }

    /// <summary>True where the jet follows the ceiling over its whole reach.</summary>
    public bool IsAttached => SeparationMetres >= Device.Terminal!.ReachMetres!.Value;

    /// <summary>Judges a device's jet.</summary>
    /// <param name="device">The device.</param>
    /// <param name="flowCubicMetresPerSecond">Flow [m³/s].</param>
    /// <param name="differenceKelvins">Supply less room temperature [K].</param>
    /// <param name="roomCelsius">Room temperature [°C].</param>
    /// <returns>The finding; null where opening, slot height or reach are not known, or nothing flows, or a value is no use.</returns>
    /// <exception cref="ArgumentNullException">The device is null.</exception>
    public static JetFinding? Judge(FlowDescriptor device, double flowCubicMetresPerSecond, double differenceKelvins, double roomCelsius)
    {
        if (Require.NotNull(device, nameof(device)) is not SupplyInlet { OpeningSquareMetres: { } opening, Terminal: { SlotHeightMetres: { } height, ReachMetres: { } reach } terminal } inlet
            || !(flowCubicMetresPerSecond > 0 && flowCubicMetresPerSecond <= 100 * opening)
            || !(Math.Abs(differenceKelvins) <= 100 && roomCelsius >= -40 && roomCelsius <= 100))
        {
            return null;
        }

        double discharge = flowCubicMetresPerSecond / opening;
        double archimedes = JetRules.Archimedes(differenceKelvins, height, discharge, roomCelsius);
        double separation = differenceKelvins < 0 ? JetRules.SeparationMetres(archimedes, height) : double.PositiveInfinity;
        double end = terminal.DecayConstant is { } k
            ? JetRules.RoundJetSpeed(k, discharge, opening, reach)
            : JetRules.PlaneWallJetSpeed(discharge, height, reach);
        return new JetFinding(inlet, discharge, archimedes, separation, end);
    }

    /// <summary>The finding in the design state of the descriptor; null where it is not complete.</summary>
    internal static JetFinding? OfDesign(FlowDescriptor device, double roomCelsius)
        => device is SupplyInlet { Terminal: { DesignCubicMetresPerSecond: { } flow, DesignDifferenceKelvins: { } difference } }
            ? Judge(device, flow, difference, roomCelsius)
            : null;

    /// <summary>The finding in one sentence.</summary>
    /// <returns>The text, the same in every culture.</returns>
    public override string ToString()
        => "Jet of '" + Device.Name + "': " + InvariantText.Rounded(DischargeMetresPerSecond) + " m/s at the terminal, Ar " + InvariantText.Rounded(Archimedes)
            + (IsAttached
                ? ", follows the ceiling over its " + InvariantText.Number(Device.Terminal!.ReachMetres!.Value, "m") + " and arrives with " + InvariantText.Rounded(EndMetresPerSecond) + " m/s."
                : ", leaves the ceiling after " + InvariantText.Rounded(SeparationMetres) + " m of " + InvariantText.Number(Device.Terminal!.ReachMetres!.Value, "m")
                    + ": forms for a ceiling swept by the jet are outside their flow pattern.");
}
