@echo off
rem Starts Connate: finds a JDK, builds on first use or when a source is newer, and runs.
rem What it makes lies in .connate beside this checkout. The shell script beside it is the model.
setlocal EnableExtensions DisableDelayedExpansion
for %%I in ("%~dp0..") do set "root=%%~fI"
set "made=%root%\.connate"

set "jdk="
if defined JAVA_HOME call :consider "%JAVA_HOME%"
if not defined jdk for /f "delims=" %%J in ('where javac 2^>nul') do for %%K in ("%%~dpJ..") do call :consider "%%~fK"
if not defined jdk (
  echo connate: no JDK 17 or newer found; install one from adoptium.net or point JAVA_HOME at it 1>&2
  exit /b 1
)

set "build="
if exist "%made%\current" for /f "usebackq delims=" %%B in ("%made%\current") do set "build=%%B"
if not defined build goto :build
if not exist "%made%\%build%\stamp" goto :build
for /f "usebackq delims=" %%R in ("%made%\%build%\stamp") do if /i not "%%R"=="%root%" goto :build
set "CONNATE_STAMP=%made%\%build%\stamp"
set "CONNATE_ROOT=%root%"
powershell -NoProfile -NonInteractive -Command "$s = (Get-Item -LiteralPath $env:CONNATE_STAMP).LastWriteTimeUtc; $r = $env:CONNATE_ROOT; $new = @(Get-Item (Join-Path $r 'pom.xml'), (Join-Path $r 'lib/*/pom.xml')) + @(Get-ChildItem (Join-Path $r 'lib/*/src/main') -Recurse) | Where-Object { $_.LastWriteTimeUtc -gt $s } | Select-Object -First 1; exit [int]($null -ne $new)"
if errorlevel 1 goto :build
goto :archive

:build
where mvn >nul 2>nul || (
  echo connate: no Maven found, and it is needed to build; install 3.8 or newer from maven.apache.org 1>&2
  exit /b 1
)
echo connate: building; this takes a minute or two 1>&2
set "build=build-%RANDOM%%RANDOM%"
mkdir "%made%\%build%" || exit /b 1
> "%made%\%build%\stamp" echo %root%
set "jars=%made:\=/%/%build%"
set "JAVA_HOME=%jdk%"
pushd "%root%"
call mvn -B -q -Dfast -Dmaven.test.skip=true "-Dwork=%made%\work" "-Djars=%jars%" -Dmdep.fileSeparator=/ -pl lib/console -am package > "%made%\build.log" 2>&1
if errorlevel 1 (
  popd
  findstr ERROR "%made%\build.log" 1>&2
  echo connate: the build failed; all of it is in %made%\build.log 1>&2
  exit /b 70
)
popd
call :arguments kernel console
call :arguments engine engine
> "%made%\current" echo %build%
for /d %%D in ("%made%\build-*") do if /i not "%%~nxD"=="%build%" rd /s /q "%%D" 2>nul

:archive
set "here=%made%\%build%"
set "archives=%here%\java-%version%"
set "flags=-XX:+UseSerialGC -XX:TieredStopAtLevel=1 -XX:-UsePerfData -XX:+DisplayVMOutputToStderr -Xshare:auto -Xlog:disable -Xlog:all=error:stderr"
if exist "%archives%" goto :go
mkdir "%archives%"
set "JDK_JAVA_OPTIONS=-XX:DumpLoadedClassList="%archives:\=/%/engine.list""
"%jdk%\bin\java" %flags% "-XX:DumpLoadedClassList=%archives%\kernel.list" "-Dconnate.home=%root%" "@%here%\engine.property" "@%here%\kernel.arguments" connate.console.Main replay "%root%\workbooks\tarn-hill\permeability.jsh" --out "%archives%\training.html" > "%made%\archive.log" 2>&1 < nul
set "JDK_JAVA_OPTIONS="
for %%P in (kernel engine) do if exist "%archives%\%%P.list" (
  "%jdk%\bin\java" -Xshare:dump -XX:+UseSerialGC "-XX:SharedClassListFile=%archives%\%%P.list" "-XX:SharedArchiveFile=%archives%\%%P.jsa" "@%here%\%%P.arguments" >> "%made%\archive.log" 2>&1
)

:go
set "archive="
if exist "%archives%\kernel.jsa" set archive="-XX:SharedArchiveFile=%archives%\kernel.jsa"
if exist "%archives%\engine.jsa" set archive=%archive% "-Dconnate.engine.archive=%archives%\engine.jsa"
"%jdk%\bin\java" %flags% %archive% "-Dconnate.home=%root%" "@%here%\engine.property" "@%here%\kernel.arguments" connate.console.Main %*
exit /b %ERRORLEVEL%

rem :consider HOME - takes the JDK there if it is one, new enough, and none was taken before
:consider
if defined jdk exit /b
if not exist "%~1\bin\javac.exe" exit /b
set "version="
for /f "usebackq tokens=2 delims==" %%V in (`findstr /b JAVA_VERSION^= "%~1\release" 2^>nul`) do set "version=%%~V"
set "feature=0"
for /f "delims=.-+" %%F in ("%version%") do set "feature=%%F"
if %feature% GEQ 17 set "jdk=%~1"
exit /b

rem :arguments NAME MODULE - the class path as an argument file, since a command line may be too short
:arguments
set "needs="
for /f "usebackq delims=" %%N in ("%made%\%build%\connate-%2.path") do set "needs=%%N"
for %%J in ("%made%\%build%\connate-%2-*.jar") do set "own=%jars%/%%~nxJ"
> "%made%\%build%\%1.arguments" echo -cp "%own%;%needs%"
if "%1"=="engine" > "%made%\%build%\engine.property" echo "-Dconnate.engine.classpath=%own%;%needs%"
exit /b
