using Credtrack.Core;
using Credtrack.Core.Rulebooks;
using Microsoft.AspNetCore.Mvc.ModelBinding;

namespace Credtrack.Web.Features.Rulebooks;

/// <param name="InForce">what the next version is compared with; null before the first</param>
/// <param name="Read">what stands in the text; null while there is none</param>
public sealed record RulebookFormPage(RulebookForm Form, Programme Programme, Rulebook? InForce, RulesRead? Read, RulesInWords? Words, RuleDifference? Difference, IReadOnlyList<string> Retired)
{
    private const int MostFaults = 100;

    public int NextVersion => (InForce?.Edition ?? 0) + 1;
    public string Digest => RulebookForm.Digest(Form.Text ?? "");

    /// <summary>Codes of the rulebook that the catalogue of the site lacks: nobody can log a scan of them.</summary>
    public IReadOnlyList<string> Unknown => [.. Words?.Rules.Applications.Select(a => a.Code).Where(code => !Words.Names.ContainsKey(code)) ?? []];

    /// <summary>Only for whoever may publish in this programme; to others it is not there.</summary>
    public static async Task<RulebookFormPage?> Load(CredtrackDb db, Me me, RulebookForm form)
    {
        var programme = me.Person.Memberships.Select(m => m.Programme).FirstOrDefault(p => p.Id == form.Programme);
        if (programme is null || Rulebook.WhyNotPublish(me.Person, programme) is not null) return null;
        var inForce = await db.RulebookInForce(programme.Id);
        var applications = await db.Applications.Select(a => new { a.Code, a.Name, IsRetired = a.RetiredAt != null }).ToListAsync();
        var names = applications.ToDictionary(a => a.Code, a => a.Name);
        var read = string.IsNullOrWhiteSpace(form.Text) ? null : Rulebook.Read(form.Text, me.Site.TimeZone);
        if (read?.Rules is not { } rules) return new(form, programme, inForce, read, null, null, []);
        var words = new RulesInWords(rules, names);
        var difference = inForce is null ? null : RuleDifference.Between(RuleLines.Of(Standings.RulesOf.Read(inForce, me.Site), words.NameOf), RuleLines.Of(rules, words.NameOf));
        return new(form, programme, inForce, read, words, difference, [.. rules.Applications.Where(a => applications.Exists(known => known.Code == a.Code && known.IsRetired)).Select(a => words.NameOf(a.Code))]);
    }

    public void Tell(ModelStateDictionary faults)
    {
        if (!faults.IsValid || Read is null) return;
        foreach (var fault in Read.Faults.Take(MostFaults)) faults.AddModelError("Form.Text", fault.ToString());
        if (Read.Faults.Count > MostFaults) faults.AddModelError("Form.Text", $"… and {Read.Faults.Count - MostFaults} more.");
    }

    public Rulebook Publish(Person by, DateTime at)
    {
        RuleBroken.If(Form.Shown == Digest ? null : "This is not the text that was looked at. Look at what it says now, then publish it.");
        return Rulebook.PublishNext(by, Programme, InForce, Form.NextVersion, Words!.Rules.Name, Form.Text!, at);
    }
}
