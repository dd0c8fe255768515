using System.Text.Json;
using Credtrack.Core.Scans;
using Microsoft.AspNetCore.DataProtection;
using Microsoft.AspNetCore.Mvc.ModelBinding;

namespace Credtrack.Web.Features.Scans.Pictures;

/// <summary>A picture that is in the store but on no scan yet, with the sealed note by which the form brings it back.</summary>
public sealed record KeptPicture(string Note, StoredStill Still);

/// <summary>Takes the pictures of a form. A good one is kept even if the rest of the form comes back, so that nobody has to attach it twice.</summary>
public sealed class Uploads(PictureFiles files, IDataProtectionProvider protection)
{
    /// <summary>Room for twelve of the largest files and the rest of the form.</summary>
    public const long LongestForm = Scan.MostPictures * (long)StillImage.MostBytes + 10 * 1024 * 1024;

    public const string Field = "Form.Pictures";

    /// <summary>What this request has taken, for whichever page answers it; null before.</summary>
    public IReadOnlyList<KeptPicture>? Taken { get; private set; }

    /// <param name="already">how many pictures the scan keeps besides</param>
    public async Task Take(Guid personId, ScanForm form, int already, ModelStateDictionary faults)
    {
        var seal = protection.CreateProtector("picture kept for", personId.ToString());
        List<KeptPicture> kept = [.. form.Kept.Distinct().Select(note => Found(note, seal)).OfType<KeptPicture>()];
        if (kept.Count < form.Kept.Distinct().Count()) faults.AddModelError(Field, "A picture from your last try cannot be found any more: attach it again.");
        if (already + kept.Count > Scan.MostPictures) faults.AddModelError(Field, $"A scan holds {Scan.MostPictures} pictures at most; leave out {already + kept.Count - Scan.MostPictures} of them.");
        for (var n = 0; n < form.Pictures.Count; n++)
        {
            if (already + kept.Count >= Scan.MostPictures)
            {
                faults.AddModelError(Field, $"A scan holds {Scan.MostPictures} pictures at most; those from picture {n + 1} on were left out.");
                break;
            }
            var (still, why) = await Clean(form.Pictures[n]);
            if (still is null) faults.AddModelError(Field, form.Pictures.Count == 1 ? why! : $"Picture {n + 1}: {why}");
            else kept.Add(await Keep(still, seal));
        }
        if (kept.Count > 0 && !form.NobodyNamed) faults.AddModelError("Form.NobodyNamed", "Look at each picture and confirm that no patient is named in it.");
        Taken = kept;
    }

    /// <summary>What was taken off a scan loses its bytes.</summary>
    public Task EraseRemoved(CredtrackDb db, Scan scan) => db.EraseUnused(files, [.. scan.Pictures.Where(p => p.RemovedAt is not null).Select(p => p.Sha256).Distinct()]);

    // The store forgets pictures of forms that were left lying for a day.
    private KeptPicture? Found(string note, IDataProtector seal) =>
        seal.Opened(note) is { } opened && JsonSerializer.Deserialize<StoredStill>(opened) is { } still && files.Has(still.Sha256) ? new(note, still) : null;

    private async Task<KeptPicture> Keep(StillImage still, IDataProtector seal)
    {
        await files.Keep(still);
        var stored = new StoredStill(still.Sha256, still.Width, still.Height);
        return new(seal.Protect(JsonSerializer.Serialize(stored)), stored);
    }

    private static async Task<(StillImage? Still, string? Why)> Clean(IFormFile file)
    {
        if (file.Length > StillImage.MostBytes) return (null, "This file is larger than 15 MB. Export the picture smaller, or as JPEG, and attach it again.");
        using var bytes = new MemoryStream((int)file.Length);
        await file.CopyToAsync(bytes);
        return await StillImage.From(bytes.ToArray());
    }
}
