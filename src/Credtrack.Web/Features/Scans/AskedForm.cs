using Credtrack.Core.Catalogue;

namespace Credtrack.Web.Features.Scans;

/// <summary>The views and questions of one application with what the form holds of them. Those of the others lie beside it, hidden and switched off.</summary>
public sealed record AskedForm(AskedOf Asked, ScanForm Form)
{
    public bool IsShown(View view) => Form.Views.Contains(view.Code);
    public bool IsGiven(Question question, Answer answer) => Form.Answers.TryGetValue(question.Code, out var given) && given == answer;
    public string Range => $"Usual here: {Asked.Application.Transducer}; depth {Asked.Application.DepthFromMm.Scaled(10)} to {Asked.Application.DepthToMm.Scaled(10)} cm; {Asked.Application.FrequencyFromKhz.Scaled(1000)} to {Asked.Application.FrequencyToKhz.Scaled(1000)} MHz.";
}
