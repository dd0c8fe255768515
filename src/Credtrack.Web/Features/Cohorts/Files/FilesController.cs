namespace Credtrack.Web.Features.Cohorts.Files;

/// <summary>The sheet for a spreadsheet: a row for each trainee and application.</summary>
[Route("cohorts/files")]
[Members]
public sealed class FilesController(CredtrackDb db, Me me, TimeProvider clock) : Controller
{
    [HttpGet("")]
    public async Task<IActionResult> Index(CohortQuery query) =>
        await CohortFile.Load(db, me, query, me.Today(clock)) is { } file ? File(file.Bytes, CsvText.Type, file.Name) : NotFound();
}
