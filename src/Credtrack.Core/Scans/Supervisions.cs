namespace Credtrack.Core.Scans;

public static class Supervisions
{
    /// <summary>
    /// The supervision that counts. Direct supervision counts as later until the person named confirms it by reading the scan;
    /// a reader may have lowered it.
    /// </summary>
    public static Supervision Counting(Supervision said, Guid? supervisorId, Guid? readerId, Supervision? atMost)
    {
        var confirmed = said == Supervision.Direct && (supervisorId is null || supervisorId != readerId) ? Supervision.Later : said;
        return atMost < confirmed ? atMost.Value : confirmed;
    }
}
