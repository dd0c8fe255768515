using System.ComponentModel.DataAnnotations;
using Microsoft.AspNetCore.Mvc.ModelBinding;

namespace Credtrack.Web.Features.Programmes.Invitations;

public sealed class ListForm
{
    public const int Longest = 60_000;

    [Display(Name = "The list"), Required(ErrorMessage = "Paste the list."), StringLength(Longest, ErrorMessage = "The list is too long. Paste it in parts.")]
    public string? List { get; set; }

    /// <summary>The list as it stood when what it will do was shown.</summary>
    public string? Seen { get; set; }

    [Display(Name = "How the links to choose a password get there")]
    public Delivery Delivery { get; set; }
}

/// <param name="What">what will be done for this line, in words</param>
public sealed record PreviewLine(PastedRow Row, string What);

public sealed record ListPage(Programme Programme, string? WhyNot, ListForm Form)
{
    private Dictionary<string, (Person Person, Account Account)> known = [];

    public IReadOnlyList<PastedRow> Rows { get; private set; } = [];
    public IReadOnlyList<PreviewLine> Preview { get; private init; } = [];

    public static async Task<ListPage?> Load(CredtrackDb db, Me me, Guid programmeId, ListForm form) =>
        await db.ProgrammesVisibleTo(me.Person, me.Site).Find(programmeId) is { } programme ? new(programme, programme.WhyNotStaff(me.Person, MembershipKind.Trainee, me.Site), form) : null;

    public async Task Judge(Inviting inviting, Me me, DateOnly today, ModelStateDictionary faults)
    {
        if (!faults.IsValid) return;
        var (rows, wrong) = PastedList.Read(Form.List!);
        (Rows, known) = (rows, await inviting.Known(rows.Select(r => r.Address)));
        var refused = from row in rows
                      let person = KnownAs(row)?.Person
                      let why = person?.WhyNotAdmit(me.Person, me.Site, Programme, row.Kind) ?? person?.WhyNotJoin(Programme, new MembershipTerms(row.Kind, today))
                      where why is not null
                      select new PastedFault(row.Line, why);
        foreach (var fault in wrong.Concat(refused).OrderBy(f => f.Line)) faults.AddModelError("Form.List", $"Line {fault.Line}: {fault.Why}");
    }

    /// <summary>The same page with what the list will do; the form that it holds says that this was seen.</summary>
    public ListPage Previewed(ModelStateDictionary typed)
    {
        typed.Remove("Form.Seen");
        Form.Seen = Form.List;
        return this with { Preview = [.. Rows.Select(row => new PreviewLine(row, What(row)))] };
    }

    public void Admit(Me me, Inviting inviting, DateTime at)
    {
        // Somebody may stand in two lines, as trainee and as reader, and is one person with one link.
        var here = new Dictionary<string, (Person Person, Account Account)>(known);
        foreach (var row in Rows)
        {
            if (!here.TryGetValue(Account.Folded(row.Address), out var one))
            {
                var person = inviting.Enrol(row.Name);
                here[Account.Folded(row.Address)] = one = (person, inviting.Open(person, row.Address));
            }
            one.Person.Admit(me.Person, me.Site, Programme, new MembershipTerms(row.Kind, at.DayIn(me.Zone), YearGroup: row.YearGroup), at);
        }
        foreach (var (person, account) in here.Values.Where(h => !h.Account.HasPassword)) inviting.Invite(person, account, InvitationKind.Member);
    }

    private (Person Person, Account Account)? KnownAs(PastedRow row) => known.TryGetValue(Account.Folded(row.Address), out var found) ? found : null;

    private string What(PastedRow row) => KnownAs(row) switch
    {
        null => "is enrolled and gets a link",
        var (person, account) => $"is {person.Name} here already, {(account.HasPassword ? "and needs no link" : "and gets a new link")}",
    };
}
