namespace Convection.Correlations.Evaluation.Kernels;

/// <summary>A heater's laws on one surface.</summary>
internal sealed class HeaterShape(int slot, LawShape? warmer, LawShape? cooler, bool warmerIsMixed, bool coolerIsMixed)
{
    /// <summary>Place of the device among those that the surface needs.</summary>
    public int Slot { get; } = slot;

    public LawShape? Warmer { get; } = warmer;

    public LawShape? Cooler { get; } = cooler;

    public bool WarmerIsMixed { get; } = warmerIsMixed;

    public bool CoolerIsMixed { get; } = coolerIsMixed;
}
