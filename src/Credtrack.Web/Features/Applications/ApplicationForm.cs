using System.ComponentModel.DataAnnotations;
using Credtrack.Core.Catalogue;
using Microsoft.AspNetCore.Mvc.ModelBinding;

namespace Credtrack.Web.Features.Applications;

/// <summary>What a coordinator typed of an application. Views, questions and parts are rows; an emptied one goes.</summary>
public sealed class ApplicationForm
{
    private const int Spare = 2;

    /// <summary>The application as it was when the form was opened.</summary>
    public int Version { get; set; }

    public string? Code { get; set; }
    public ApplicationKind Kind { get; set; }
    public string? Name { get; set; }

    [Display(Name = "Usual transducer")]
    public string? Transducer { get; set; }

    [Display(Name = "Depth from")]
    public string? DepthFrom { get; set; }

    [Display(Name = "Depth to")]
    public string? DepthTo { get; set; }

    [Display(Name = "Frequency from")]
    public string? FrequencyFrom { get; set; }

    [Display(Name = "Frequency to")]
    public string? FrequencyTo { get; set; }

    public string? Note { get; set; }
    public List<ViewRow> Views { get; set; } = [];
    public List<QuestionRow> Questions { get; set; } = [];
    public List<string?> Parts { get; set; } = [];

    /// <summary>Which button: "view", "question" or "part" asks for one more row, else save.</summary>
    public string? As { get; set; }

    public bool AsksForARow => As is "view" or "question" or "part";

    public static ApplicationForm Of(Application application) => new()
    {
        Version = application.Version,
        Code = application.Code,
        Kind = application.Kind,
        Name = application.Name,
        Transducer = application.Transducer,
        DepthFrom = application.DepthFromMm.Scaled(10),
        DepthTo = application.DepthToMm.Scaled(10),
        FrequencyFrom = application.FrequencyFromKhz.Scaled(1000),
        FrequencyTo = application.FrequencyToKhz.Scaled(1000),
        Note = application.Note,
        Views = [.. application.Views.Select(v => new ViewRow { Code = v.Code, Name = v.Name, Need = v.Need, Group = v.Group })],
        Questions = [.. application.Questions.Select(q => new QuestionRow { Code = q.Code, Text = q.Text, Positive = q.Positive })],
        Parts = [.. application.Subtypes],
    };

    public ApplicationForm WithARow()
    {
        if (As == "view") Views.Add(new());
        if (As == "question") Questions.Add(new());
        if (As == "part") Parts.Add(null);
        return this;
    }

    /// <summary>Without the rows that were emptied. The rest keep what was typed, but move up, so what came with the request under their old numbers goes.</summary>
    public void Tidy(ModelStateDictionary typed)
    {
        Views.RemoveAll(v => v.IsEmpty);
        Questions.RemoveAll(q => q.IsEmpty);
        Parts.RemoveAll(string.IsNullOrWhiteSpace);
        string[] rows = [nameof(Views), nameof(Questions), nameof(Parts)];
        foreach (var key in typed.Keys.Where(k => rows.Any(row => k.StartsWith($"Form.{row}[", StringComparison.OrdinalIgnoreCase))).ToList()) typed.Remove(key);
    }

    /// <summary>With some empty rows at the end to go on with. A procedure begins with its target.</summary>
    public ApplicationForm Spread()
    {
        if (Kind == ApplicationKind.Procedure && Questions.Count == 0) Questions.Add(new() { Code = Question.TargetReached, Text = "Target reached?" });
        while (Views.Count < Spare || Views.TakeLast(Spare).Any(v => !v.IsEmpty)) Views.Add(new());
        while (Questions.Count < Spare || Questions.TakeLast(Spare).Any(q => !q.IsEmpty)) Questions.Add(new());
        if (Parts is not [.., null or ""]) Parts.Add(null);
        return this;
    }
}

public sealed class ViewRow
{
    /// <summary>Stays when the name is changed; a new view has none yet.</summary>
    public string? Code { get; set; }
    public string? Name { get; set; }
    public ViewNeed Need { get; set; }
    public string? Group { get; set; }
    public bool IsEmpty => string.IsNullOrWhiteSpace(Name);
}

public sealed class QuestionRow
{
    public string? Code { get; set; }
    public string? Text { get; set; }
    public Answer? Positive { get; set; }
    public bool IsTarget => Code == Question.TargetReached;
    public bool IsEmpty => string.IsNullOrWhiteSpace(Text) && !IsTarget;
}
