namespace Convection.Correlations.Evaluation;

/// <summary>A heat flux with its slopes: value [W/m²], and per kelvin of surface, room and supply temperature [W/(m²·K)].</summary>
internal readonly struct Flux
{
    public Flux(double value, double surface, double room, double supply)
    {
        Value = value;
        Surface = surface;
        Room = room;
        Supply = supply;
    }

    public double Value { get; }

    public double Surface { get; }

    public double Room { get; }

    public double Supply { get; }
}
