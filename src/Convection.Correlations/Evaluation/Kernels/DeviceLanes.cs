namespace Convection.Correlations.Evaluation.Kernels;

/// <summary>Order of what a kernel reads of each device.</summary>
internal static class DeviceLanes
{
    /// <summary>Volume flow [m³/s].</summary>
    public const int Flow = 0;

    /// <summary>Speed of the stream [m/s].</summary>
    public const int Speed = 1;

    /// <summary>Temperature of the supply air or the stream [°C]; NaN where not given.</summary>
    public const int Air = 2;

    /// <summary>Output of a heater as a fraction of its full output.</summary>
    public const int Output = 3;

    public const int Count = 4;
}
