using Credtrack.Core.Rulebooks;

namespace Credtrack.Web.Features.Rulebooks;

/// <summary>What a rulebook says, for people.</summary>
/// <param name="Names">the names of the catalogue's applications, by code</param>
public sealed record RulesInWords(Rules Rules, IReadOnlyDictionary<string, string> Names)
{
    public string NameOf(ApplicationRules application) => application.Name ?? NameOf(application.Code);

    public string NameOf(string code) => Names.GetValueOrDefault(code, code);
}
