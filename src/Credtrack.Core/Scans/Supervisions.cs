namespace Credtrack.Core.Scans;

public static class Supervisions
{
    /// <summary>
    /// The supervision that counts. Direct supervision counts as later until the person named confirms it, by saying so or by reading the scan,
    /// and for good where that person says not to have been there; a reader may have lowered it.
    /// </summary>
    /// <param name="wasThere">what the person named has said; null while nothing</param>
    /// <param name="attested">an import says so, and names nobody</param>
    public static Supervision Counting(Supervision said, Guid? supervisorId, Guid? readerId, Supervision? atMost, bool? wasThere = null, bool attested = false)
    {
        var confirmed = supervisorId is null ? attested : wasThere ?? supervisorId == readerId;
        var counting = said == Supervision.Direct && !confirmed ? Supervision.Later : said;
        return atMost < counting ? atMost.Value : counting;
    }
}
