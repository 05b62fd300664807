namespace Convection.Correlations.Evaluation;

/// <summary>The states of a room's devices by index: an array, or a single one for the first device.</summary>
internal readonly struct DeviceStates
{
    private readonly DeviceState[]? all;
    private readonly DeviceState single;

    public DeviceStates(DeviceState[] all)
    {
        this.all = all;
        single = default;
    }

    public DeviceStates(DeviceState single)
    {
        all = null;
        this.single = single;
    }

    public DeviceState this[int device] => all is not null ? all[device] : device == 0 ? single : default;
}
