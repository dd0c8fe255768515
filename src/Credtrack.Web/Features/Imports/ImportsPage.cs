using Credtrack.Core.Imports;

namespace Credtrack.Web.Features.Imports;

/// <summary>The imports of the programmes that one coordinates, newest first, fifty a page.</summary>
public sealed record ImportsPage(IReadOnlyList<Import> Lines, int Page, int All)
{
    public const int Size = 50;
    public bool HasMore => Page * Size < All;

    public static async Task<ImportsPage> Load(CredtrackDb db, Person person, int page)
    {
        var visible = db.ImportsVisibleTo(person).AsNoTracking();
        return new(await visible.OrderByDescending(i => i.At).Skip((page - 1) * Size).Take(Size).ToListAsync(), page, await visible.CountAsync());
    }

    public static string Printed(ImportState state) => state switch
    {
        ImportState.Uploaded => "uploaded, its columns are not explained yet",
        ImportState.Mapped => "ready to be looked at and confirmed",
        ImportState.HalfStaged => "not finished: take it up again or throw it away",
        ImportState.Confirmed => "confirmed",
        ImportState.Undone => "undone",
        _ => "thrown away",
    };
}
