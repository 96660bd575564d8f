using FrameSafe;

namespace Relay;

/// <summary>The station at the head of the track: sends pulses on its timetable and takes the answers.</summary>
internal sealed class Station
{
    /// <summary>Seconds between two pulses.</summary>
    [Unit("s")]
    [InFrame<Harbour>]
    private readonly double _interval;

    public Station([Unit("s")] [InFrame<Harbour>] double interval, [Unit("km")] [InFrame<Harbour>] double receiverBehind)
    {
        _interval = interval;
        ReceiverBehind = receiverBehind;
    }

    /// <summary>How far behind the head of the track the receiving dish stands. The yard's drawings are in kilometres.</summary>
    [Unit("km")]
    [InFrame<Harbour>]
    public double ReceiverBehind { get; }

    /// <summary>When a pulse of the timetable leaves.</summary>
    [return: Unit("s")]
    [return: InFrame<Harbour>]
    public double SendingTime(int pulse) => _interval * pulse;

    /// <summary>When an answer that leaves a place on the track is received.</summary>
    [return: Unit("s")]
    [return: InFrame<Harbour>]
    public double ReceptionOf([Unit("s")] [InFrame<Harbour>] double sent, [Unit("m")] [InFrame<Harbour>] double place)
    {
        double path = place + ReceiverBehind;
        return sent + Light.TimeOver(path);
    }

    /// <summary>How long a test pulse takes from the head of the track to the dish.</summary>
    [return: Unit("s")]
    [return: InFrame<Harbour>]
    public double SelfTest() => Light.TimeOver(ReceiverBehind);
}
