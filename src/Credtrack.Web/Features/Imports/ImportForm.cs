using System.ComponentModel.DataAnnotations;
using Microsoft.AspNetCore.Mvc.ModelBinding;

namespace Credtrack.Web.Features.Imports;

public sealed class ImportForm
{
    public const int LongestFile = 50 * 1024 * 1024;

    /// <summary>The parts around the file take a little more.</summary>
    public const int LongestForm = LongestFile + 64 * 1024;

    [Display(Name = "Programme")]
    public Guid Programme { get; set; }

    public IFormFile? File { get; set; }

    /// <summary>The bytes of a file that can be read as a table; else null, and why stands beside the field.</summary>
    public async Task<byte[]?> Take(ModelStateDictionary typed)
    {
        var (bytes, fault) = File is not { Length: > 0 } ? (null, "Choose a CSV file that is not empty.")
            : File.Length > LongestFile ? (null, "This file is larger than 50 MB. Split it, and import one part after the other.")
            : (await Bytes(), (string?)null);
        if (bytes is not null) SentTable.Read(bytes, out fault);
        if (fault is null) return bytes;
        typed.AddModelError("Form.File", fault);
        return null;
    }

    private async Task<byte[]> Bytes()
    {
        using var bytes = new MemoryStream((int)File!.Length);
        await File.CopyToAsync(bytes);
        return bytes.ToArray();
    }
}

/// <summary>The programmes for which one may import.</summary>
public sealed record NewImportPage(IReadOnlyList<(string Id, string Name)> Programmes, ImportForm Form)
{
    public static NewImportPage Of(Person person, ImportForm form)
    {
        var programmes = person.Memberships.Where(m => m.Kind == MembershipKind.Coordinator).Select(m => m.Programme).DistinctBy(p => p.Id).OrderBy(p => p.Name).ToList();
        if (programmes.TrueForAll(p => p.Id != form.Programme)) form.Programme = programmes[0].Id;
        return new([.. programmes.Select(p => ($"{p.Id}", p.Name))], form);
    }
}
