namespace Convection.Correlations.Evaluation;

/// <summary>What has to be said about a surface's state, apart from its numbers.</summary>
internal struct Remarks
{
    public ConvectionStatus Status;
    public ConvectionFlags Flags;
    public ulong Used;

    public Remarks()
    {
        Status = ConvectionStatus.Valid;
    }

    public void Refuse(bool isRefused) => Status = isRefused && Status == ConvectionStatus.Valid ? ConvectionStatus.OutOfRangeRefused : Status;
}
